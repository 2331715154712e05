import { callFunction } from '../../functions/call';
import { CellError, type CellResult } from '../../functions/cell';
import { catalogue } from '../../functions/catalogue';
import { defineFunction, type CellFunction } from '../../functions/define';
import { column, number, optional, readings } from '../../functions/parameters';
import {
  associateAll,
  excelHandler,
  keepLoadedWithWorkbook,
  type CustomFunctionsHost,
} from '../../functions/runtime';
import { InvalidInput, NotDetermined } from '../../src/errors';

/** Excel's own error object: words are refused where Excel would not show them. */
class ExcelError {
  constructor(
    readonly code: string,
    readonly message?: string,
  ) {
    const codes = ['#VALUE!', '#N/A', '#DIV/0!', '#NUM!', '#NULL!', '#NAME?', '#REF!'];
    if (!codes.includes(code)) throw new Error(`unknown code ${code}`);
    if (message !== undefined && code !== '#VALUE!' && code !== '#N/A')
      throw new Error(`${code} carries no words`);
  }
}

class FakeHost implements CustomFunctionsHost {
  readonly handlers = new Map<string, (...args: unknown[]) => unknown>();
  readonly Error = ExcelError;
  associate(id: string, handler: (...args: unknown[]) => unknown): void {
    if (this.handlers.has(id)) throw new Error(`${id} is associated twice`);
    this.handlers.set(id, handler);
  }
}

const host = new FakeHost();
const invocation = { address: 'Sheet1!A1', functionName: 'X', parameterAddresses: [] };

const shared = {
  family: 'rate' as const,
  summary: '',
  method: '',
  uncertainty: '',
  seeAlso: [],
  result: { unit: '1', shape: 'one value' as const },
  example: { formula: '', equals: 0 },
  reference: '',
};

/** A function that answers what it was told to, and keeps what it was given. */
function answering(answer: () => CellResult): CellFunction {
  return defineFunction({
    ...shared,
    name: 'ANSWER',
    parameters: { x: optional(number({ help: '' })) },
    run: answer,
  });
}

const thrown = (call: () => unknown): unknown => {
  try {
    return { returned: call() };
  } catch (error) {
    return error;
  }
};

test('associateAll gives Excel every function once, under its name', () => {
  const fresh = new FakeHost();
  associateAll({ CustomFunctions: fresh });
  expect([...fresh.handlers.keys()]).toEqual(catalogue.map(({ name }) => name));
});

test('associateAll is silent where Excel is not', () => {
  expect(() => associateAll({})).not.toThrow();
  expect(() => associateAll({ CustomFunctions: {} })).not.toThrow();
});

test('a handler answers as callFunction does', () => {
  const f = catalogue.find(({ name }) => name === 'EVENT')!;
  expect(excelHandler(f, host)([[40], [25]], null, null, invocation)).toEqual([[0.025], [0.04]]);
  expect(callFunction(f, [[[40], [25]]])).toEqual([[0.025], [0.04]]);
});

test('null is an argument left out, and what Excel adds at the end is no argument', () => {
  const seen: unknown[] = [];
  const f = defineFunction({
    ...shared,
    name: 'SEEN',
    parameters: { x: optional(number({ help: '' }), 7) },
    run: ({ x }) => {
      seen.push(x);
      return x;
    },
  });
  const call = excelHandler(f, host);
  expect([call(null, invocation), call(3, invocation)]).toEqual([7, 3]);
  expect(seen).toEqual([7, 3]);
});

test('blank cells in a range, "" or null, are gaps', () => {
  const f = defineFunction({
    ...shared,
    name: 'GAPS',
    parameters: { x: column({ help: '' }) },
    run: ({ x }) => x.numbers.filter((value) => value === null).length,
  });
  expect(excelHandler(f, host)([[1], [''], [null], [0], ['n/a']], invocation)).toBe(3);
});

describe('a zero that may be a blank', () => {
  const gaps = defineFunction({
    ...shared,
    name: 'GAPS',
    parameters: { x: column({ help: '' }), y: column({ help: '' }) },
    run: ({ x, y }) => [...x.numbers, ...y.numbers].map((value) => [value === null ? 'gap' : value]),
  });
  const x = [[0], [10], [0]];
  const y = [[5], [6], [7]];
  const at = { parameterAddresses: ['Run!A1:A3', 'Run!B1:B3'] };

  test('is looked at in the sheet, and only there', async () => {
    const blanksIn = jest.fn(async () => [[false], [false], [true]]);
    const answer = await excelHandler(gaps, host, { blanksIn })(x, y, at);
    expect(answer).toEqual([[0], [10], ['gap'], [5], [6], [7]]);
    expect(blanksIn.mock.calls).toEqual([['Run!A1:A3']]);
  });

  test('costs nothing where there is no zero', () => {
    const blanksIn = jest.fn();
    expect(excelHandler(gaps, host, { blanksIn })(y, [[1], [2]], at)).toEqual([[5], [6], [7], [1], [2]]);
    expect(blanksIn).not.toHaveBeenCalled();
  });

  test('is looked at where nothing else stands, too: a single cell, a column of zeros', async () => {
    const blanksIn = jest.fn(async () => [[true], [false]]);
    expect(await excelHandler(gaps, host, { blanksIn })([[0], [0]], y, at)).toEqual([
      ['gap'],
      [0],
      [5],
      [6],
      [7],
    ]);
    expect(await excelHandler(gaps, host, { blanksIn })(0, y, at)).toEqual([['gap'], [5], [6], [7]]);
  });

  test('is believed in what is no reference, and where the sheet cannot be read', async () => {
    const blanksIn = jest.fn(() => Promise.reject(new Error('busy')));
    expect(excelHandler(gaps, host, { blanksIn })(x, y, { parameterAddresses: [null, null] })).toHaveLength(
      6,
    );
    expect(excelHandler(gaps, host, { blanksIn })(x, y)).toHaveLength(6);
    expect(await excelHandler(gaps, host, { blanksIn })(x, y, at)).toEqual([[0], [10], [0], [5], [6], [7]]);
  });

  test('an error still reaches the cell as one', async () => {
    const call = excelHandler(gaps, host, { blanksIn: async () => [[false], [true], [true]] });
    const block = [
      [0, 1],
      [2, 3],
    ];
    await expect(call(block, y, at)).rejects.toMatchObject({ code: '#VALUE!' });
  });

  test('formulas that ask at once share one look', async () => {
    const fresh = new FakeHost();
    const blanksIn = jest.fn(async () => [[false], [false]]);
    associateAll({ CustomFunctions: fresh }, { blanksIn });
    const event = fresh.handlers.get('EVENT')!;
    const times = [[0], [25]];
    const ask = async (): Promise<unknown> => event(times, null, null, at);
    await Promise.allSettled([ask(), ask(), ask()]);
    expect(blanksIn).toHaveBeenCalledTimes(1);
    await Promise.allSettled([ask()]);
    expect(blanksIn).toHaveBeenCalledTimes(2);
  });
});

test('an error cell in a range is the answer, with its own code', () => {
  const f = defineFunction({
    ...shared,
    name: 'ERRS',
    parameters: { x: column({ help: '' }) },
    run: () => 1,
  });
  const error = thrown(() => excelHandler(f, host)([[1], [new ExcelError('#DIV/0!')]], invocation));
  expect(error).toBeInstanceOf(ExcelError);
  expect(error).toMatchObject({ code: '#DIV/0!', message: undefined });
});

test('a conversion keeps an error cell in its place', () => {
  const f = defineFunction({
    ...shared,
    name: 'KEEP',
    parameters: { x: readings({ help: '' }) },
    run: ({ x }) => x.numbers.map((value, place) => [x.errors.get(place) ?? value ?? '']),
  });
  const answer = excelHandler(f, host)(
    [[1], [new ExcelError('#N/A', 'no reading')], ['']],
    invocation,
  ) as unknown[][];
  expect(answer[0]).toEqual([1]);
  expect(answer[1][0]).toBeInstanceOf(ExcelError);
  expect(answer[1][0]).toMatchObject({ code: '#N/A', message: 'no reading' });
  expect(answer[2]).toEqual(['']);
});

test('our words reach the cell beside #VALUE! and #N/A', () => {
  const invalid = answering(() => {
    throw new InvalidInput('time must be above 0: got −1');
  });
  const unknown = answering(() => {
    throw new NotDetermined('a tangent of degree 2 needs 3 times: got 2');
  });
  expect(thrown(() => excelHandler(invalid, host)(null))).toMatchObject({
    code: '#VALUE!',
    message: 'time must be above 0: got −1',
  });
  expect(thrown(() => excelHandler(unknown, host)(null))).toMatchObject({
    code: '#N/A',
    message: 'a tangent of degree 2 needs 3 times: got 2',
  });
});

test('a code that a function may not answer becomes #VALUE! and says what it was', () => {
  const error = thrown(() =>
    excelHandler(
      answering(() => new CellError('#SPILL!')),
      host,
    )(null),
  );
  expect(error).toMatchObject({ code: '#VALUE!', message: 'an input shows #SPILL!' });
});

test('words are dropped beside codes that carry none', () => {
  const error = thrown(() =>
    excelHandler(
      answering(() => new CellError('#NUM!', 'too large')),
      host,
    )(null),
  );
  expect(error).toMatchObject({ code: '#NUM!', message: undefined });
});

test('no number that is not finite leaves a handler', () => {
  const answer = excelHandler(
    answering(() => [[NaN, Infinity, 1]]),
    host,
  )(null) as unknown[][];
  expect(answer[0][2]).toBe(1);
  for (const cell of answer[0].slice(0, 2)) expect(cell).toMatchObject({ code: '#N/A' });
});

test('keepLoadedWithWorkbook asks for it once, and never fails', async () => {
  const setStartupBehavior = jest.fn(async () => undefined);
  await keepLoadedWithWorkbook({
    Office: { addin: { setStartupBehavior }, StartupBehavior: { load: 'Load' } },
  });
  expect(setStartupBehavior.mock.calls).toEqual([['Load']]);
  const told = { setStartupBehavior, getStartupBehavior: async () => 'Load' };
  await keepLoadedWithWorkbook({ Office: { addin: told, StartupBehavior: { load: 'Load' } } });
  expect(setStartupBehavior).toHaveBeenCalledTimes(1);
  await keepLoadedWithWorkbook({});
  await keepLoadedWithWorkbook({ Office: {} });
  await keepLoadedWithWorkbook({
    Office: { addin: { setStartupBehavior: () => Promise.reject(new Error('no')) } },
  });
});
