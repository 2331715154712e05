/** What the functions that work on a written mechanism have in common. */
import { InvalidInput, shown } from '../../src/errors';
import type { Tell } from '../../src/progress';
import { closedCourseOf } from '../../src/scheme/closedCourse';
import { courseOf } from '../../src/scheme/course';
import { parseScheme } from '../../src/scheme/parse';
import { reactionInWords, type Scheme } from '../../src/scheme/scheme';
import { CellError, shownCell, type CellRange } from '../cell';
import { placeInWords, type Column } from '../column';
import { plainNumber } from '../format';
import { column, required, type Parameter } from '../parameters';

/** One cell with the whole mechanism, or a step a cell. */
export function scheme(): Parameter<Scheme> {
  return {
    kind: 'text',
    help: 'steps such as A + B -> C; C <-> D, in one cell or a step a cell; a space on each side of a plus',
    unit: 'text',
    dimension: 'matrix',
    optional: false,
    read: (cells, name) => parseScheme(writtenSteps(required(cells, name), name)),
  };
}

function writtenSteps(cells: CellRange, name: string): string {
  const steps = cells.flat().filter((cell) => cell !== null && cell !== '');
  return steps
    .map((cell) => {
      if (cell instanceof CellError) throw cell;
      if (typeof cell === 'string') return cell;
      throw new InvalidInput(`${name} must be text: got ${shownCell(cell)}`);
    })
    .join('\n');
}

export const schemeParameters = {
  scheme: scheme(),
  coefficients: column({
    help: 'one rate coefficient a step, two for a step with <->, forward first',
    unit: 'concentration^(1−n) per time',
  }),
  initial: column({ help: 'concentration of each species at time 0, in order of first appearance' }),
  times: column({ help: 'times since the start, 0 or later' }),
};

/** A list in which every place must be filled. @param owner whose number stands at a place */
export function filled(list: Column, name: string, owner: (place: number) => string): number[] {
  return list.numbers.map((value, place) => {
    if (value !== null) return value;
    throw new InvalidInput(
      `${name} must have no gaps: ${placeInWords(place, list)}, for ${owner(place)}, holds no number`,
    );
  });
}

/** The times without their gaps. @throws InvalidInput for one before the start */
export function timesOf(times: Column): number[] {
  return times.numbers.flatMap((time, place) => {
    if (time === null) return [];
    if (time >= 0) return [time];
    throw new InvalidInput(
      `times must be 0 or later, since initial belongs to time 0: ${placeInWords(place, times)} (${shown(time)})`,
    );
  });
}

/** The concentration of each species at each time; nothing where there is a gap. */
export function courseAt(
  scheme: Scheme,
  coefficients: readonly number[],
  initial: readonly number[],
  times: Column,
  tell?: Tell,
): (Float64Array | null)[] {
  const asked = timesOf(times);
  const end = asked.reduce((latest, time) => Math.max(latest, time), 0);
  const watch = (time: number): void =>
    tell?.({ doing: `at time ${plainNumber(time, 3)} of ${plainNumber(end, 3)}`, share: time / end });
  const given = [scheme, coefficients, initial, asked] as const;
  const rows = (closedCourseOf(...given) ?? courseOf(...given, { watch }))[Symbol.iterator]();
  return times.numbers.map((time) => (time === null ? null : (rows.next().value as Float64Array)));
}

export const stepAt =
  (scheme: Scheme) =>
  (place: number): string =>
    place < scheme.reactions.length ? reactionInWords(scheme, place) : 'a step that the scheme does not have';

export const speciesAt =
  ({ species }: Scheme) =>
  (place: number): string =>
    species[place] ?? 'a species that the scheme does not have';

export const schemeEquations = {
  lines: ['vⱼ = kⱼ ∏ᵢ cᵢ^(a_ij)', 'dcᵢ/dt = ∑ⱼ ν_ij vⱼ'],
  where: {
    vⱼ: 'rate of step j',
    kⱼ: 'rate coefficient of step j',
    cᵢ: 'concentration of species i',
    a_ij: 'how often species i stands on the left side of step j',
    t: 'time',
    ν_ij: 'stoichiometric number of species i in step j: what stands on the right less what stands on the left',
  },
};

export const schemeMethod =
  'Each step is taken as elementary, as written. The equations are integrated by a Rosenbrock method of order 5 with analytic derivatives, which stiff mechanisms do not slow down; initial belongs to time 0.';
