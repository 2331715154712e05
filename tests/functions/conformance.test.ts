/** The same answers in Excel, as its side is documented, as in the local workbook: every function, cell for cell. */
import { callFunction } from '../../functions/call';
import { catalogue } from '../../functions/catalogue';
import { CellError, isRange, type CellResult } from '../../functions/cell';
import { typedName, type CellFunction } from '../../functions/define';
import { asShownByExcel, throughExcel } from '../support/excelHost';
import { callIn } from '../support/literal';

type Arguments = (CellResult | undefined)[];

const each = catalogue.map((f) => [typedName(f), f] as const);

/** The same call with one cell of each range changed: the last but one, where there are three or more. */
const withCell = (args: Arguments, cell: CellResult): Arguments =>
  args.map((argument) => {
    if (argument === undefined || !isRange(argument) || argument.length < 3) return argument;
    const place = argument.length - 2;
    return argument.map((row, r) => (r === place ? row.map(() => cell as never) : row));
  });

async function agree(f: CellFunction, args: Arguments): Promise<void> {
  expect(await throughExcel(f, args)).toEqual(asShownByExcel(callFunction(f, args)));
}

describe.each(each)('%s through Excel', (_, f) => {
  const { args } = callIn(f.example.formula);

  test('its example, with arguments left out as null', () => agree(f, args));
  test('a blank cell in every range, which arrives as 0', () => agree(f, withCell(args, null)));
  test('a true zero in every range, which arrives as 0 too', () => agree(f, withCell(args, 0)));
  test('words in every range', () => agree(f, withCell(args, 'n/a')));
  test('an error cell in every range', () => agree(f, withCell(args, new CellError('#DIV/0!'))));
  test('nothing at all', () => agree(f, []));
});

test('a blank and a zero are told apart: the answers differ', async () => {
  const { f, args } = callIn('=PACE.GASVOLUME({1;2;3},20,100)');
  const blank = (await throughExcel(f, withCell(args, null))) as unknown[][];
  const zero = (await throughExcel(f, withCell(args, 0))) as unknown[][];
  expect(blank[1]).toEqual(['']);
  expect(zero[1]).toEqual([0]);
});
