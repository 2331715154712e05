import { SaxesParser } from 'saxes';
import { catalogue, functionNamed } from '../../functions/catalogue';
import { isRange } from '../../functions/cell';
import { typedName } from '../../functions/define';
import { anyRefusals } from '../../functions/help/errorsPage';
import { exampleSheet } from '../../functions/help/exampleSheet';
import { helpFiles } from '../../functions/help/files';
import { escaped } from '../../functions/help/html';
import { wordsOf } from '../../functions/refusals';
import { byMeasurement, byQuestion, job } from '../../functions/help/ways';
import { callIn } from '../../functions/literal';

const files = helpFiles(catalogue);
const pages = [...files].filter(([name]) => name.endsWith('.html'));

test('every function has its page, with all that its definition says', () => {
  for (const f of catalogue) {
    const page = files.get(`${f.name.toLowerCase()}.html`)!;
    expect(page).toMatch(new RegExp(`<h1[^>]*>${typedName(f).replace('.', '\\.')}</h1>`));
    for (const text of [f.summary, f.method, f.uncertainty, f.example.formula])
      expect(page).toContain(escaped(text));
    for (const [name, { help }] of Object.entries(f.parameters)) {
      expect(page).toContain(`<code>${name}</code>`);
      expect(page).toContain(escaped(help));
    }
    if (f.caution) expect(page).toContain(escaped(f.caution));
    expect(page.match(/<math display/g)?.length ?? 0).toBe(f.equations?.lines.length ?? 0);
  }
});

test('every link leads to a file and a part of it that are there, or to a document by its DOI', () => {
  for (const [from, content] of pages) {
    for (const [, to] of content.matchAll(/(?:href|src)="([^"]+)"/g)) {
      const [file, part] = to.split('#');
      const isOurs = file === '' || files.has(file);
      expect(isOurs || to.startsWith('https://doi.org/10.') ? '' : `${from}: ${to}`).toBe('');
      if (isOurs && part) expect(files.get(file || from)).toContain(`id="${part}"`);
    }
  }
});

test.each(pages)(
  '%s is well formed, in one language, and its headings go down one level at a time',
  (_, page) => {
    const parser = new SaxesParser();
    const levels: number[] = [];
    parser.on('error', (error) => {
      throw error;
    });
    parser.on('opentag', ({ name }) => {
      if (/^h\d$/.test(name)) levels.push(Number(name[1]));
    });
    parser.write(page.replace(/^<!doctype html>\n/, '')).close();
    expect(page).toContain('<html lang="en">');
    expect(levels[0]).toBe(1);
    expect(levels.filter((level) => level === 1)).toHaveLength(1);
    levels.slice(1).forEach((level, i) => expect(level - levels[i]).toBeLessThanOrEqual(1));
  },
);

test('no sign of HTML slips through from the words of a definition', () => {
  expect(escaped('a < b & "c" > d')).toBe('a &lt; b &amp; &quot;c&quot; &gt; d');
  // COURSE's help speaks of A -> B
  expect(files.get('course.html')).not.toMatch(/A -> B/);
});

test('a call that a page says is refused is refused, with words unless it hands an error on', () => {
  for (const { formula, mend } of [...catalogue.flatMap((f) => f.refusals ?? []), ...anyRefusals]) {
    const { code, message } = wordsOf(formula);
    expect(['#VALUE!', '#N/A'].includes(code) ? message : code).toMatch(/^(?:[\p{L}\d].*[^.]|#DIV\/0!)$/u);
    expect(mend).toMatch(/^\p{Lu}.*[.?]$/u);
  }
  expect(() => wordsOf('=PACE.EVENT(40)')).toThrow(/is answered/);
});

test('a refusal stands with the function that it is of', () => {
  for (const f of catalogue) for (const { formula } of f.refusals ?? []) expect(callIn(formula).f).toBe(f);
});

test('the example in cells holds the same data as the example in one formula', () => {
  for (const { example } of catalogue) {
    const sheet = exampleSheet(example.formula);
    const lists = callIn(example.formula).args.filter(isRange);
    expect(sheet === undefined).toBe(lists.length === 0);
    const given = lists.flatMap((list) => list.flat()).filter((cell) => cell !== null);
    expect(
      (sheet?.rows ?? [])
        .flat()
        .filter((cell) => cell !== null)
        .sort(),
    ).toEqual([...given].sort());
  }
  // worked out by hand
  expect(exampleSheet('=PACE.TANGENT({0;1;2},{5;6;8},1,3)')).toEqual({
    headings: ['times', 'values'],
    rows: [
      [0, 5],
      [1, 6],
      [2, 8],
    ],
    formula: '=PACE.TANGENT(A2:A4,B2:B4,1,3)',
  });
});

test('neighbours and ways name functions that there are, and every function is on some way', () => {
  const ways = [...byMeasurement, ...byQuestion, ...job].flatMap(({ functions }) => functions);
  for (const name of [...ways, ...catalogue.flatMap(({ seeAlso }) => seeAlso)])
    expect(functionNamed(name)).toBeDefined();
  const missed = catalogue.filter(({ name }) => !ways.includes(name)).map(({ name }) => name);
  expect(missed).toEqual(['DISSOLVED'].filter((name) => missed.includes(name)));
  for (const { name, seeAlso } of catalogue) expect(seeAlso).not.toContain(name);
});
