/** Parameters that several functions share, with the one meaning each has everywhere. */
import { InvalidInput } from '../src/errors';
import { shownCell, type CellRange } from './cell';
import { readColumn, requireLine, type Column } from './column';
import { flag, isLeftOut, number, optional, single, type Parameter } from './parameters';

/** The value at infinite time: a number, or `"free"` to have it fitted. */
export type Endpoint = number | 'free' | undefined;

export function endpoint(): Parameter<Endpoint> {
  return {
    kind: 'endpoint',
    help: 'reading at infinite time: a number, or "free" to fit it',
    unit: 'of the readings',
    dimension: 'scalar',
    optional: true,
    whenOmitted: '0 for a falling column; a rising column needs one',
    read(cells, name) {
      if (cells === undefined || isLeftOut(cells)) return undefined;
      const cell = single(cells, name);
      if (typeof cell === 'number') return cell;
      if (typeof cell === 'string' && cell.trim().toLowerCase() === 'free') return 'free';
      throw new InvalidInput(`${name} must be a number or "free": got ${shownCell(cell)}`);
    },
  };
}

/** Standard uncertainties of the readings: one a reading, or in proportion to each. */
export type Uncertainties = Column | 'relative' | undefined;

export function uncertainties(): Parameter<Uncertainties> {
  return {
    kind: 'uncertainties',
    help: 'standard uncertainties, one a reading, or "relative" for the same share of each',
    unit: 'of the readings',
    dimension: 'matrix',
    optional: true,
    whenOmitted: 'equal for all readings',
    read(cells, name) {
      if (cells === undefined || isLeftOut(cells)) return undefined;
      if (cells.length === 1 && cells[0].length === 1) {
        const cell = single(cells, name);
        if (typeof cell === 'string' && cell.trim().toLowerCase() === 'relative') return 'relative';
        throw new InvalidInput(
          `${name} must be a range, one a reading, or "relative": got ${shownCell(cell)}`,
        );
      }
      const read = readColumn(cells);
      requireLine(read, name);
      return read;
    },
  };
}

/** `[detail]`, the last parameter wherever an estimate is given. */
export const detail = (): Parameter<boolean> =>
  optional(
    flag({ help: 'TRUE for a row: value, standard uncertainty, lower 95 %, upper 95 %, degrees of freedom' }),
    false,
  );

/** `[coefficient]`, wherever a rate is given. */
export const stoichiometricNumber = (): Parameter<number | undefined> =>
  optional(
    {
      ...number({ help: 'signed stoichiometric number: −1 a reactant, +1 a product, −2 …' }),
      read: readStoichiometric,
    },
    undefined,
    '−1 if the column falls, +1 if it rises',
  );

function readStoichiometric(cells: CellRange | undefined, name: string): number {
  const value = number({ help: '' }).read(cells, name);
  if (value === 0) throw new InvalidInput(`${name} must not be 0: a species that takes no part has no rate`);
  return value;
}

/** `[wet]`: the fraction of saturation with water vapour; TRUE stands for 1. */
export const saturation = (): Parameter<number> => {
  const bounds = { atLeast: 0, atMost: 1 };
  const plain = number({ help: 'water vapour in the gas: 0 dry, 1 or TRUE saturated', ...bounds });
  const read = (cells: CellRange | undefined, name: string): number => {
    const cell = cells && single(cells, name);
    return typeof cell === 'boolean' ? Number(cell) : plain.read(cells, name);
  };
  return optional({ ...plain, read }, 0, '0, a dry gas');
};
