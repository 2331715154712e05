/** The same answers in Excel, as its side is documented, as when a function is called by itself, cell for cell. */
import { callFunction } from '../../functions/call';
import { sharingCaller } from '../../functions/caller';
import { catalogue } from '../../functions/catalogue';
import type { CellResult } from '../../functions/cell';
import { typedName } from '../../functions/define';
import type { LongWork } from '../../functions/longWork';
import { asShownByExcel, ExcelError, excelSide } from '../support/excelHost';
import { functionCases, withCell } from '../support/functionCases';
import { callIn } from '../support/literal';

const expected = (one: (typeof functionCases)[number]): unknown =>
  asShownByExcel(callFunction(one.f, one.args));

test.each(functionCases.map((one) => [one.title, one] as const))('%s', async (_, one) => {
  expect(await excelSide().call(one.f, one.args).shown).toEqual(expected(one));
});

test('a blank and a zero are told apart: the answers differ', async () => {
  const { f, args } = callIn('=PACE.GASVOLUME({1;2;3},20,100)');
  const excel = excelSide();
  const [blank, zero] = await Promise.all([null, 0].map((cell) => excel.call(f, withCell(args, cell)).shown));
  expect(blank[1]).toEqual(['']);
  expect(zero[1]).toEqual([0]);
});

/** Looks into the sheet and long work that end when they are told to. */
function slowHost() {
  const waiting: (() => void)[] = [];
  const stops: AbortSignal[] = [];
  const longWork: LongWork = {
    run: (f, args, stop) =>
      new Promise<CellResult>((settle) => {
        stops.push(stop!);
        waiting.push(() => settle(callFunction(f, args)));
      }),
  };
  const beforeLook = (): Promise<void> => new Promise((settle) => waiting.push(settle));
  return { waiting, stops, excel: excelSide({ caller: sharingCaller(longWork), beforeLook }) };
}

/** Lets all that can go on go on. */
const breathe = (): Promise<void> => new Promise((resolve) => setImmediate(resolve));

test('all calls at once: looks into the sheet and long work end last first, and every answer is the right one', async () => {
  const { waiting, excel } = slowHost();
  const calls = functionCases.map((one) => ({ one, shown: excel.call(one.f, one.args).shown }));
  const all = Promise.all(calls.map(({ shown }) => shown));
  let steps = 0;
  for (await breathe(); waiting.length > 0; await breathe(), steps++) waiting.pop()!();
  expect(steps).toBeGreaterThan(20);
  expect(await all).toEqual(calls.map(({ one }) => expected(one)));
});

describe.each(catalogue.filter(({ isLong }) => isLong === true).map((f) => [typedName(f), f] as const))(
  '%s, which takes long',
  (_, f) => {
    const { args } = callIn(f.example.formula);

    test('is cancelled: its cell gets an error, and nobody goes on working', async () => {
      const { stops, waiting, excel } = slowHost();
      const { shown, cancel } = excel.call(f, args);
      // a zero among the arguments is looked at first
      while (stops.length === 0) {
        await breathe();
        if (stops.length === 0) waiting.pop()!();
      }
      cancel();
      expect(await shown).toEqual([[new ExcelError('#N/A', expect.stringContaining('stopped') as never)]]);
      expect(stops[0].aborted).toBe(true);
    });

    test('is asked for by two cells: one calculation, and one cell can leave', async () => {
      const { stops, waiting, excel } = slowHost();
      const [left, stayed] = [excel.call(f, args), excel.call(f, args)];
      for (await breathe(); stops.length === 0; await breathe()) waiting.splice(0).forEach((go) => go());
      left.cancel();
      await left.shown;
      for (await breathe(); waiting.length > 0; await breathe()) waiting.pop()!();
      expect(await stayed.shown).toEqual(asShownByExcel(callFunction(f, args)));
      expect(stops).toHaveLength(1);
    });
  },
);
