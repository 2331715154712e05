/** The house rules that a compiler does not know: who may import whom, and how large a file may grow. */
import { readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';
import ts from 'typescript';

const root = path.resolve(__dirname, '../..');

/** From left to right; each imports itself and what stands before it. */
const layers = ['src', 'functions', 'taskpane', 'workbook', 'scripts', 'tests'] as const;

/** Packages a layer may import; a layer not listed here is free to choose. */
const packages: Readonly<Record<string, readonly string[]>> = {
  src: ['mathjs', 'ml-regression'],
  functions: [],
  taskpane: ['@microsoft/office-js-helpers'],
};

const files = layers.flatMap((layer) =>
  readdirSync(path.join(root, layer), { recursive: true, encoding: 'utf8' })
    .filter((file) => file.endsWith('.ts'))
    .map((file) => ({ layer, path: path.posix.join(layer, file.split(path.sep).join('/')) })),
);

const textOf = (file: string): string => readFileSync(path.join(root, file), 'utf8');
const importsOf = (text: string): string[] =>
  ts.preProcessFile(text).importedFiles.map(({ fileName }) => fileName);

const importsIn = files.flatMap((file) =>
  importsOf(textOf(file.path)).map((name) => ({
    ...file,
    name,
    /** The layer it comes from, or nothing for a package. */
    from: name.startsWith('.')
      ? path.posix.join(path.posix.dirname(file.path), name).split('/')[0]
      : undefined,
  })),
);

test('there are files in every layer, and imports to judge', () => {
  for (const layer of layers) expect(files.some((file) => file.layer === layer)).toBe(true);
  expect(importsIn.length).toBeGreaterThan(100);
});

test('a layer imports only itself and earlier ones', () => {
  const later = importsIn.filter(
    ({ layer, from }) =>
      from !== undefined &&
      layers.includes(from as (typeof layers)[number]) &&
      layers.indexOf(from as (typeof layers)[number]) > layers.indexOf(layer),
  );
  expect(later.map(({ path: file, name }) => `${file} imports ${name}`)).toEqual([]);
});

test('the maths, the functions and the pane use only the packages they need', () => {
  const others = importsIn.filter(
    ({ layer, name, from }) => from === undefined && packages[layer] && !packages[layer].includes(name),
  );
  expect(others.map(({ path: file, name }) => `${file} imports ${name}`)).toEqual([]);
});

test('every package that is imported is one that the project names', () => {
  const { dependencies, devDependencies } = JSON.parse(textOf('package.json')) as Record<string, object>;
  const named = new Set([...Object.keys(dependencies), ...Object.keys(devDependencies)]);
  const packageOf = (name: string): string =>
    name
      .split('/')
      .slice(0, name.startsWith('@') ? 2 : 1)
      .join('/');
  const unnamed = importsIn.filter(
    ({ name, from }) => from === undefined && !name.startsWith('node:') && !named.has(packageOf(name)),
  );
  expect(unnamed.map(({ path: file, name }) => `${file} imports ${name}`)).toEqual([]);
});

test('one folder knows the spreadsheet engine, one door leads to Office.js, one file knows its helpers', () => {
  const strays = importsIn
    .filter(({ name }) => name.startsWith('@univerjs/'))
    .filter(({ path: file }) => !file.startsWith('workbook/engine/univer/') && !file.startsWith('tests/'));
  expect(strays.map(({ path: file, name }) => `${file} imports ${name}`)).toEqual([]);
  const excelCallers = files.filter(
    ({ path: file }) =>
      !file.startsWith('tests/') &&
      /\bExcel\.(?:run|createWorkbook)\b|\bOffice\.context\b/.test(textOf(file)),
  );
  expect(excelCallers.map(({ path: file }) => file)).toContain('taskpane/excel.ts');
  expect(excelCallers.filter(({ path: file }) => !/^taskpane\/excel[./]/.test(file))).toEqual([]);
  const helperUsers = importsIn.filter(
    ({ name, layer }) => name === '@microsoft/office-js-helpers' && layer !== 'tests',
  );
  expect(helperUsers.map(({ path: file }) => file)).toEqual(['taskpane/host.ts']);
});

test('the maths knows no clock, chance, page, network or console', () => {
  const impure =
    /\b(Date\.now|new Date\(\)|Math\.random|setTimeout|setInterval|fetch\(|globalThis|(?:document|process|console|performance)\.)/;
  const found = files
    .filter(({ layer }) => layer === 'src')
    .map(({ path: file }) => ({ file, hit: impure.exec(withoutComments(textOf(file)))?.[0] }))
    .filter(({ hit }) => hit !== undefined);
  expect(found).toEqual([]);
});

test('no file grows beyond 300 lines', () => {
  const long = files.map(({ path: file }) => ({ file, lines: textOf(file).split('\n').length - 1 }));
  expect(long.filter(({ lines }) => lines > 300)).toEqual([]);
});

const withoutComments = (text: string): string => text.replace(/\/\*[\s\S]*?\*\/|\/\/.*$/gm, '');
