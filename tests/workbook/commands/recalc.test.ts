import {
  existsSync,
  linkSync,
  mkdirSync,
  readdirSync,
  readFileSync,
  symlinkSync,
  writeFileSync,
} from 'node:fs';
import { dirname } from 'node:path';
import { packageOf, rowsOf, withMacros, worksheet } from '../xlsx/package';
import { buildCommands, recalc, temporaryFolder } from './command';

const good = packageOf({
  sheets: {
    Run: worksheet(
      '<row r="1"><c r="A1"><v>40</v></c><c r="B1"><f>_xldudf_PACE_EVENT(A1)</f><v>9</v></c></row>',
    ),
  },
});
const faulty = packageOf({
  sheets: {
    'Gas run': worksheet(
      '<row r="1"><c r="A1"><v>0</v></c><c r="B1"><f>_xldudf_PACE_EVENT(A1)</f></c><c r="C1"><f>1/0</f></c><c r="D1"><f>NOSUCH(1)</f></c></row>',
    ),
  },
});

let folder: ReturnType<typeof temporaryFolder>;

beforeAll(buildCommands, 300_000);
beforeEach(() => {
  folder = temporaryFolder();
});
afterEach(() => folder.remove());

function file(name: string, content: string | Uint8Array): string {
  writeFileSync(folder.path(name), content);
  return folder.path(name);
}

/** Not done: one line why, and the folder as it was. */
function expectRefusal(args: string[], words: RegExp): void {
  const before = readdirSync(folder.path('.'));
  const { code, out, err } = recalc(...args);
  expect({ code, out }).toEqual({ code: 2, out: '' });
  expect(err).toMatch(words);
  expect(err.trimEnd().split('\n')).toHaveLength(1);
  expect(readdirSync(folder.path('.'))).toEqual(before);
}

describe('done', () => {
  test('exit code 0, the values in OUT, IN as it was, nothing else in the folder', () => {
    const input = file('in.xlsx', good);
    const output = folder.path('out.xlsx');
    expect(recalc(input, output)).toEqual({ code: 0, out: `${output}: 1 formula calculated\n`, err: '' });
    expect(rowsOf(readFileSync(output))).toContain('<v>0.025</v>');
    expect(readFileSync(input).equals(good)).toBe(true);
    expect(readdirSync(folder.path('.'))).toEqual(['in.xlsx', 'out.xlsx']);
  });

  test('OUT is replaced where it was there', () => {
    const output = file('out.xlsx', 'old');
    expect(recalc(file('in.xlsx', good), output).code).toBe(0);
    expect(rowsOf(readFileSync(output))).toContain('<v>0.025</v>');
  });

  test('exit code 1 where cells are errors: each with sheet, cell and why', () => {
    const { code, err } = recalc(file('in.xlsx', faulty), folder.path('out.xlsx'));
    expect(code).toBe(1);
    expect(err).toBe(
      [
        "'Gas run'!B1  #VALUE!  times must be above 0: row 1 (0)",
        "'Gas run'!C1  #DIV/0!",
        "'Gas run'!D1  #NAME?  no function or name here is called that",
        '',
      ].join('\n'),
    );
    expect(existsSync(folder.path('out.xlsx'))).toBe(true);
  });

  test('a workbook without formulas is copied byte for byte', () => {
    const plain = packageOf({ sheets: { Run: worksheet('<row r="1"><c r="A1"><v>1</v></c></row>') } });
    expect(recalc(file('in.xlsx', plain), folder.path('out.xlsx')).code).toBe(0);
    expect(readFileSync(folder.path('out.xlsx')).equals(plain)).toBe(true);
  });
});

describe('not done', () => {
  test('no arguments: how it is used; help is no failure', () => {
    const none = recalc();
    expect(none.code).toBe(2);
    expect(none.err).toMatch(/recalc -- IN\.xlsx OUT\.xlsx/);
    const help = recalc('--help');
    expect(help.code).toBe(0);
    expect(help.out).toMatch(/Exit code {2}0 {2}done/);
  });

  test('one argument, or three', () => {
    expectRefusal([file('in.xlsx', good)], /two files are needed.*got 1/);
    expectRefusal([folder.path('in.xlsx'), folder.path('out.xlsx'), 'more'], /two files are needed.*got 3/);
  });

  test('IN missing, or a folder', () => {
    expectRefusal(
      [folder.path('none.xlsx'), folder.path('out.xlsx')],
      /none\.xlsx cannot be read: there is no such file/,
    );
    mkdirSync(folder.path('in.xlsx'));
    expectRefusal([folder.path('in.xlsx'), folder.path('out.xlsx')], /cannot be read: it is a folder/);
  });

  test.each<[string, string | Uint8Array, RegExp]>([
    ['cut off', good.slice(0, 300), /cut off or damaged/],
    [
      'of an older program',
      new Uint8Array([0xd0, 0xcf, 0x11, 0xe0, 0xa1, 0xb1, 0x1a, 0xe1, 0, 0]),
      /not an \.xlsx workbook: it is a file of an older Office program/,
    ],
    ['of text', 't,V\n0,0\n', /not an \.xlsx/],
    ['empty', '', /empty/],
  ])('IN %s', (_, content, words) => {
    expectRefusal([file('in.xlsx', content), folder.path('out.xlsx')], words);
  });

  test('OUT the same file as IN, by its name, another name or a link', () => {
    const input = file('in.xlsx', good);
    linkSync(input, folder.path('hard.xlsx'));
    symlinkSync(input, folder.path('soft.xlsx'));
    for (const name of ['in.xlsx', 'hard.xlsx', 'soft.xlsx', './in.xlsx']) {
      expectRefusal([input, `${dirname(input)}/${name}`], /OUT must be another file than IN/);
    }
    expect(readFileSync(input).equals(good)).toBe(true);
  });

  test('OUT in a folder that is not there, or a folder itself', () => {
    const input = file('in.xlsx', good);
    expectRefusal([input, folder.path('nowhere/out.xlsx')], /folder of .* does not exist/);
    mkdirSync(folder.path('out.xlsx'));
    expectRefusal([input, folder.path('out.xlsx')], /is not a file/);
  });

  test('OUT by a name under which Excel would not open it', () => {
    const input = file('in.xlsx', withMacros(good));
    expectRefusal([input, folder.path('out.xlsx')], /OUT must end in \.xlsm, .*: got .*out\.xlsx/);
    expectRefusal([file('in.xlsm', good), folder.path('out.xlsm')], /OUT must end in \.xlsx/);
    expect(recalc(input, folder.path('out.xlsm')).code).toBe(0);
  });

  test('a refused calculation leaves an old OUT alone', () => {
    const output = file('out.xlsx', 'old');
    expectRefusal([file('in.xlsx', 'no workbook'), output], /not an \.xlsx/);
    expect(readFileSync(output, 'utf8')).toBe('old');
  });

  (process.platform === 'linux' ? test : test.skip)('OUT where nothing can be written', () => {
    expectRefusal([file('in.xlsx', good), '/proc/self/out.xlsx'], /cannot be written/);
  });
});
