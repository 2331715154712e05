/** The engine's built-in straight line against NIST's certified values: a check of how numbers travel through cells. */
import strd from '../../reference/nist-strd-linear.json';
import { calculate } from '../../../workbook/engine/univer/headless';
import { book, column } from './book';

const norris = strd.cases.find(({ name }) => name === 'Norris')!;

test('SLOPE, INTERCEPT and LINEST meet NIST StRD Norris to 10 digits', async () => {
  const { x, y } = norris.data as { x: number[]; y: number[] };
  const [intercept, slope] = norris.certified.parameters;
  const [interceptError, slopeError] = norris.certified.standardDeviations;
  const last = x.length;
  const result = await calculate(
    book({
      Norris: {
        ...column('A1', x),
        ...column('B1', y),
        D1: `=SLOPE(B1:B${last},A1:A${last})`,
        E1: `=INTERCEPT(B1:B${last},A1:A${last})`,
        D3: `=LINEST(B1:B${last},A1:A${last},TRUE,TRUE)`,
      },
    }),
  );
  const shown = (row: number, c: number): number => result.shown('Norris', row, c) as number;
  const agree = (value: number, certified: number): void => expect(value / certified).toBeCloseTo(1, 10);
  agree(shown(0, 3), slope);
  agree(shown(0, 4), intercept);
  agree(shown(2, 3), slope);
  agree(shown(2, 4), intercept);
  agree(shown(3, 3), slopeError);
  agree(shown(3, 4), interceptError);
});
