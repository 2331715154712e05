/** Where help begins: which function answers what, with a search that needs no network. */
import { typedName, type CellFunction } from '../define';
import { byFamily } from '../readmeTable';
import { pageName } from './functionPage';
import { escaped, page } from './html';

export function indexPage(catalogue: readonly CellFunction[]): string {
  const families = byFamily(catalogue).map(
    ([heading, functions]) =>
      `<section><h2>${heading}</h2><table><tbody>\n${functions.map(row).join('\n')}\n</tbody></table></section>`,
  );
  const body = [
    '<h1>Which function do I need?</h1>',
    '<p class="search"><label>Look for <input id="look-for" type="search" autocomplete="off" /></label></p>',
    ...families,
    '<script src="help.js"></script>',
  ];
  return page('Flaskpace: the functions', body.join('\n'));
}

const row = (f: CellFunction): string =>
  `<tr><td><a href="${pageName(f)}">${typedName(f)}</a></td><td>${escaped(f.summary)}</td></tr>`;

/** Hides what does not hold every word that is typed. */
export const script = `const box = document.getElementById('look-for');
box.addEventListener('input', () => {
  const words = box.value.toLowerCase().split(/\\s+/);
  for (const section of document.querySelectorAll('section')) {
    let found = 0;
    for (const row of section.querySelectorAll('tr')) {
      const text = row.textContent.toLowerCase();
      row.hidden = !words.every((word) => text.includes(word));
      if (!row.hidden) found++;
    }
    section.hidden = found === 0;
  }
});
`;
