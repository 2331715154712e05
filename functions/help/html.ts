/** Text as HTML, and the frame that all help pages share. */

const entities: Readonly<Record<string, string>> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;' };

export const escaped = (text: string): string => text.replace(/[&<>"]/g, (sign) => entities[sign]);

/** On every page, in this order. */
const ways = [
  ['index.html', 'Which function?'],
  ['pictures.html', 'Pictures'],
  ['errors.html', 'Errors'],
  ['everything.html', 'All on one page'],
] as const;

/** A table that scrolls by itself where the page is narrow. @param headings and cells already HTML; the first cell of a row heads it */
export function table(
  headings: readonly string[],
  rows: readonly (readonly string[])[],
  className = '',
): string {
  const head = headings.map((heading) => `<th scope="col">${heading}</th>`).join('');
  const body = rows.map(
    ([first, ...rest]) =>
      `<tr><th scope="row">${first}</th>${rest.map((cell) => `<td>${cell}</td>`).join('')}</tr>`,
  );
  const kind = className ? ` class="${className}"` : '';
  return `<div class="wide" tabindex="0"><table${kind}>\n<thead><tr>${head}</tr></thead>\n<tbody>\n${body.join('\n')}\n</tbody>\n</table></div>`;
}

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
    <nav aria-label="Help">${ways.map(([to, name]) => `<a href="${to}">${name}</a>`).join(' ')}</nav>
    <main>
${body}
    </main>
  </body>
</html>
`;
