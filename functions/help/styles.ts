/** How the help pages look: quiet, readable, printable; the colours are the pane's. */
export const styles = `:root {
  color-scheme: light dark;
  --paper: light-dark(#fbfaf6, #171d21);
  --card: light-dark(#ffffff, #20282d);
  --ink: light-dark(#202b33, #e6eaeb);
  --quiet: light-dark(#55626b, #a9b5ba);
  --rule: light-dark(#d8d9d0, #37434a);
  --edge: light-dark(#7b878c, #87949a);
  --press: light-dark(#175c66, #86c9d0);
  --rate: light-dark(#ad4310, #f2a56c);
  --reading: light-dark(#5f727d, #9fadb3);
  --warn-paper: light-dark(#fdf1e4, #3a2a1e);
}
* { box-sizing: border-box; }
body {
  max-width: 50rem;
  margin: 0 auto;
  padding: 1rem 1.25rem 3rem;
  background: var(--paper);
  color: var(--ink);
  font: 1rem/1.55 system-ui, 'Segoe UI', sans-serif;
  overflow-wrap: break-word;
}
nav { display: flex; flex-wrap: wrap; gap: 0.25rem 1.25rem; padding-bottom: 0.5rem; border-bottom: 1px solid var(--rule); }
a { color: var(--press); text-underline-offset: 0.15em; }
a:focus-visible, input:focus-visible, [tabindex]:focus-visible { outline: 2px solid var(--press); outline-offset: 2px; }
h1 { font-size: 1.6rem; line-height: 1.2; margin: 1.25rem 0 0.5rem; }
h2 { font-size: 1.15rem; margin: 2rem 0 0.5rem; }
h3 { font-size: 1rem; margin: 1.5rem 0 0.25rem; }
p { margin: 0.5rem 0; }
code, pre { font-family: ui-monospace, 'Cascadia Mono', Consolas, monospace; font-size: 0.9em; }
pre { margin: 0.5rem 0; padding: 0.6rem 0.8rem; border: 1px solid var(--rule); border-radius: 4px; background: var(--card); white-space: pre-wrap; overflow-wrap: anywhere; }
.wide { overflow-x: auto; margin: 0.5rem 0; }
table { border-collapse: collapse; width: 100%; }
th, td { padding: 0.35rem 0.9rem 0.35rem 0; border-bottom: 1px solid var(--rule); text-align: start; vertical-align: top; font-weight: normal; }
thead th { color: var(--quiet); font-size: 0.9em; }
table.cells { width: max-content; font-variant-numeric: tabular-nums; }
table.cells th, table.cells td { padding: 0.15rem 0.75rem; border: 1px solid var(--rule); }
table.cells th { color: var(--quiet); text-align: center; }
table.cells td { max-width: 20rem; background: var(--card); }
.lead { font-size: 1.1rem; }
.caution { padding: 0.6rem 0.8rem; background: var(--warn-paper); border-radius: 4px; }
.quiet { color: var(--quiet); }
.unseen { position: absolute; width: 1px; height: 1px; overflow: hidden; clip-path: inset(50%); }
.equations { margin: 0.75rem 0; padding: 0.5rem 1rem; border-left: 3px solid var(--rate); overflow-x: auto; }
math { font-family: 'Cambria Math', 'STIX Two Math', 'Latin Modern Math', 'DejaVu Math TeX Gyre', math; font-size: 1.15em; }
math[display='block'] { width: max-content; margin: 0.5rem 0; }
dl.where { display: grid; grid-template-columns: max-content 1fr; gap: 0.1rem 0.9rem; margin: 0.5rem 0; }
dl.where dt, dl.where dd { margin: 0; }
dl.where math { font-size: 1.05em; }
figure { margin: 0.75rem 0 1.5rem; }
.panels { display: grid; grid-template-columns: repeat(auto-fit, minmax(min(100%, 19rem), 1fr)); gap: 0.75rem 1.25rem; }
.panel { max-width: 32rem; display: flex; flex-direction: column; justify-content: space-between; }
.panel .heading { margin: 0 0 0.35rem; font-size: 0.95em; line-height: 1.35; }
figcaption { margin-top: 0.5rem; color: var(--quiet); }
.plot { display: block; width: 100%; height: auto; fill: none; overflow: visible; }
.plot text { fill: var(--quiet); font: 11px system-ui, 'Segoe UI', sans-serif; }
.plot text.name, .plot text.note { fill: var(--ink); font-size: 12px; }
.plot text.note { paint-order: stroke; stroke: var(--paper); stroke-width: 3px; }
.plot .grid { stroke: var(--rule); }
.plot :is(.axis, .tick) { stroke: var(--edge); }
.plot :is(.readings, .touch) { stroke: var(--reading); stroke-linecap: round; stroke-width: 5px; }
.plot .later { stroke: var(--edge); stroke-width: 3.5px; }
.plot .fourth { stroke: var(--ink); }
.plot .window { stroke: var(--press); stroke-width: 7px; }
.plot .touch { stroke: var(--rate); stroke-width: 7.5px; }
.plot .curve { stroke: var(--press); stroke-width: 1.5px; }
.plot .rate-line { stroke: var(--rate); stroke-width: 2px; }
.plot .beyond { stroke: var(--reading); stroke-width: 1.5px; stroke-dasharray: 4 3; }
.plot .bar { stroke: var(--rate); stroke-width: 1.5px; }
.plot .band { fill: var(--press); fill-opacity: 0.14; }
.plot .drop { stroke: var(--edge); stroke-dasharray: 2 3; }
.plot .stem { stroke: var(--reading); stroke-width: 1.5px; }
input { font: inherit; padding: 0.45rem 0.6rem; width: 100%; color: inherit; background: var(--card); border: 1px solid var(--edge); border-radius: 4px; }
.found { list-style: none; padding: 0; }
.found li, .functions li { margin: 0.35rem 0; }
.functions { list-style: none; padding: 0; }
.way { display: grid; grid-template-columns: repeat(auto-fit, minmax(8.5rem, 1fr)); gap: 0.75rem; padding: 0; list-style: none; counter-reset: step; }
.way li { padding: 0.5rem 0.7rem; background: var(--card); border: 1px solid var(--rule); border-top: 3px solid var(--press); border-radius: 4px; }
.way strong { display: block; }
.way a { display: block; font-size: 0.88em; }
[hidden] { display: none !important; }
@media (max-width: 30rem) {
  body { padding: 0.75rem 0.75rem 2rem; }
  th, td { padding-right: 0.6rem; }
}
@media print {
  :root { color-scheme: light; }
  nav, .search, .screen { display: none; }
  body { max-width: none; padding: 0; font-size: 10pt; background: none; }
  h1, h2, h3 { break-after: avoid; }
  figure, tr, pre, .equations { break-inside: avoid; }
  .wide { overflow: visible; }
  table.cells { width: auto; font-size: 8pt; }
  table.cells th, table.cells td { padding: 0.1rem 0.3rem; }
  .one-function + .one-function { border-top: 1px solid var(--rule); }
  h2:has(+ .one-function) { break-before: page; }
  a { color: inherit; text-decoration: none; }
}
`;
