/** Text as HTML, and the frame that all help pages share. */

const entities: Readonly<Record<string, string>> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;' };

export const escaped = (text: string): string => text.replace(/[&<>"]/g, (sign) => entities[sign]);

/** @param body already HTML */
export const page = (title: string, body: string): string => `<!doctype html>
<html lang="en">
  <head>
    <meta charset="utf-8" />
    <meta name="viewport" content="width=device-width, initial-scale=1" />
    <meta name="color-scheme" content="light dark" />
    <title>${escaped(title)}</title>
    <link rel="stylesheet" href="help.css" />
  </head>
  <body>
${body}
  </body>
</html>
`;

/** Quiet, readable, printable; the colours are the pane's. */
export const styles = `:root {
  color-scheme: light dark;
  --paper: light-dark(#fbfaf6, #171d21);
  --ink: light-dark(#202b33, #e6eaeb);
  --quiet: light-dark(#55626b, #a9b5ba);
  --rule: light-dark(#d8d9d0, #37434a);
  --press: light-dark(#175c66, #7cc4cd);
  --warn-paper: light-dark(#fdf1e4, #3a2a1e);
}
body {
  max-width: 46rem;
  margin: 0 auto;
  padding: 1.5rem;
  background: var(--paper);
  color: var(--ink);
  font: 1rem/1.5 system-ui, sans-serif;
}
a { color: var(--press); }
h1 { font-size: 1.5rem; }
h2 { font-size: 1.1rem; margin-top: 2rem; }
code, pre { font-family: ui-monospace, monospace; font-size: 0.92em; }
pre { padding: 0.6rem 0.8rem; border: 1px solid var(--rule); border-radius: 4px; white-space: pre-wrap; }
table { border-collapse: collapse; width: 100%; }
th, td { padding: 0.3rem 0.6rem 0.3rem 0; border-bottom: 1px solid var(--rule); text-align: start; vertical-align: top; }
.caution { padding: 0.6rem 0.8rem; background: var(--warn-paper); border-radius: 4px; }
.quiet { color: var(--quiet); }
input { font: inherit; padding: 0.4rem 0.6rem; width: 100%; box-sizing: border-box; }
@media print {
  nav, .search { display: none; }
  body { max-width: none; padding: 0; }
}
`;
