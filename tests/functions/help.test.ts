import { catalogue } from '../../functions/catalogue';
import { typedName } from '../../functions/define';
import { helpFiles } from '../../functions/help/files';
import { escaped } from '../../functions/help/html';

const files = helpFiles(catalogue);

test('every function has its page, with all that its definition says', () => {
  for (const f of catalogue) {
    const page = files.get(`${f.name.toLowerCase()}.html`)!;
    expect(page).toContain(`<h1>${typedName(f)}</h1>`);
    for (const text of [f.summary, f.method, f.example.formula]) expect(page).toContain(escaped(text));
    for (const [name, { help }] of Object.entries(f.parameters)) {
      expect(page).toContain(`<code>${name}</code>`);
      expect(page).toContain(escaped(help));
    }
    if (f.caution) expect(page).toContain(escaped(f.caution));
  }
});

test('every link leads to a file that is there, or to a document by its DOI', () => {
  for (const content of [...files.values()]) {
    for (const [, to] of content.matchAll(/(?:href|src)="([^"]+)"/g)) {
      expect(files.has(to) || to.startsWith('https://doi.org/10.')).toBe(true);
    }
  }
});

test('no sign of HTML slips through from the words of a definition', () => {
  expect(escaped('a < b & "c" > d')).toBe('a &lt; b &amp; &quot;c&quot; &gt; d');
  // COURSE's help speaks of A -> B
  expect(files.get('course.html')).not.toMatch(/A -> B/);
});
