import { dots, type Place } from '../../drawing/frame';
import { plainNumber } from '../../format';
import { columnOf, estimateOf, numbersOf, rowsOf } from './answers';
import { note, panel, panelFrame } from './panel';
import type { Panel, Picture } from './picture';

/** mmol/L of bleach at the start of each run; of dye there are always 0.1. */
const bleach = [0.1, 0.15, 0.3];
const classes = ['readings', 'readings window', 'touch'];
const scheme = 'dye + bleach -> clear';
/** L/(mmol min) */
const coefficient = 0.4;
const clock = Array.from({ length: 13 }, (_, i) => 5 * i);

interface Run {
  readonly times: number[][];
  readonly product: number[][];
  readonly reactant: number[][];
}

/** Calculated without scatter, so that what is seen is the method alone. */
export const runs = (): Run[] =>
  bleach.map((start) => {
    const rows = rowsOf('COURSE', scheme, coefficient, columnOf([0.1, start, 0]), columnOf(clock));
    const species = (place: number): number[][] => columnOf(rows.map((row) => Number(row[place])));
    return { times: columnOf(clock), reactant: species(1), product: species(2) };
  });

/** The order in bleach, from the first and the last run. */
export const orderFound = ([first, , last]: readonly Run[]): number =>
  estimateOf(
    'OVERLAYORDER',
    first.times,
    first.product,
    first.reactant,
    last.times,
    last.product,
    last.reactant,
  ).value;

export const normalised = ({ times, reactant, product }: Run, exponent: number): Place[] => {
  const at = numbersOf('NORMALTIME', times, reactant, exponent);
  return product.map(([y], i) => ({ x: at[i], y }));
};

function exponentPanel(heading: string, all: readonly Run[], exponent: number, x: string): Panel {
  const laid = all.map((run) => normalised(run, exponent));
  const frame = panelFrame([0, Math.min(...laid.map((points) => points[12].x)) * 2], [0, 0.1]);
  const inside = laid.map((points) => points.filter((point) => point.x <= frame.x.to));
  const last = inside.map((points) => points[points.length - 1]);
  return panel(
    {
      heading,
      frame,
      x,
      y: 'clear / (mmol/L)',
      says: `three runs against time normalised with the exponent ${exponent}`,
    },
    ...inside.map((points, run) => dots(frame, points, classes[run])),
    ...(exponent === 0
      ? last.map((at, run) => note(frame, at, `bleach ${bleach[run]}`, { by: [8, 4] }))
      : []),
  );
}

export function overlayPicture(): Picture {
  const all = runs();
  const units = ['t / min', 'Σ c^½ Δt', 'Σ c Δt / (mmol L⁻¹ min)'];
  return {
    name: 'overlay',
    title: 'Time normalised until the runs fall together',
    functions: ['NORMALTIME', 'OVERLAYORDER'],
    caption: `Three runs of ${scheme.replace('->', '→')}, calculated for three amounts of bleach. Let the clock of each run go faster where there is more bleach, in proportion to its concentration to the power β. With the right β all runs lie on one curve, and that β is the order in bleach: with ½ they still part, with 1 they fall together. PACE.OVERLAYORDER finds ${plainNumber(orderFound(all), 3)} from the first and the last.`,
    panels: [
      exponentPanel('β = 0: the clock on the wall', all, 0, units[0]),
      exponentPanel('β = ½', all, 0.5, units[1]),
      exponentPanel('β = 1', all, 1, units[2]),
    ],
  };
}
