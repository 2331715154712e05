import { dots, line, type Place } from '../../drawing/frame';
import { dyeInTwoSteps } from '../../demo/runs';
import { valueWithUncertainty } from '../../format';
import { columnOf, pointsOf, rowsOf } from './answers';
import { curveOf, note, panel, panelFrame } from './panel';
import type { Picture } from './picture';

const scheme = 'dye -> pale; pale -> clear';
const initial = columnOf([0.1, 0, 0]);
const observed = dyeInTwoSteps.map(([, dye, pale]) => [dye, pale, null]);

/** Standard rows of both rate coefficients. */
export const fittedSteps = (): { value: number; uncertainty: number }[] =>
  rowsOf(
    'FITCOURSE',
    scheme,
    columnOf([0.1, 0.01]),
    initial,
    columnOf(dyeInTwoSteps.map(([t]) => t)),
    observed,
    true,
  ).map(([value, uncertainty]) => ({ value: Number(value), uncertainty: Number(uncertainty) }));

/** Columns of dye, pale and clear. */
export function courses(coefficients: readonly number[], at: readonly number[]): Place[][] {
  const rows = rowsOf('COURSE', scheme, columnOf(coefficients), initial, columnOf(at));
  return [0, 1, 2].map((species) => rows.map((row, i) => ({ x: at[i], y: Number(row[species]) })));
}

export function twoStepCourse(): Picture {
  const steps = fittedSteps();
  const k = steps.map(({ value }) => value);
  const frame = panelFrame([0, 130], [0, 0.1]);
  const [dye, pale, clear] = courses(
    k,
    curveOf(0, 130, (x) => x, 52).map(({ x }) => x),
  );
  const peak = pale.reduce((a, b) => (b.y > a.y ? b : a));
  const inWords = steps.map(({ value, uncertainty }) => `${valueWithUncertainty(value, uncertainty)} min⁻¹`);
  return {
    name: 'two-steps',
    title: 'A reaction in two steps',
    functions: ['COURSE', 'FITCOURSE'],
    caption: `A dye that fades by way of a pale intermediate, ${scheme.replaceAll('->', '→')}. Both readings together give both coefficients: k₁ = ${inWords[0]}, k₂ = ${inWords[1]}. The intermediate is highest where it forms as fast as it goes, near ${Math.round(peak.x)} min; the clear product, which nobody measured, starts late.`,
    panels: [
      panel(
        {
          heading: 'Readings and the fitted course',
          frame,
          x: 't / min',
          y: 'c / (mmol/L)',
          says: `dye falls, pale rises to ${peak.y.toFixed(3)} at ${Math.round(peak.x)} min and falls, clear rises`,
        },
        line(frame, dye, 'curve'),
        line(frame, pale, 'rate-line'),
        line(frame, clear, 'curve beyond'),
        dots(frame, pointsOf(dyeInTwoSteps), 'readings window'),
        dots(frame, pointsOf(dyeInTwoSteps, 2), 'touch'),
        note(frame, dye[2], 'dye', { by: [9, -4] }),
        note(frame, pale[24], 'pale', { by: [4, -6] }),
        note(frame, clear[46], 'clear', { anchor: 'end', by: [-4, -6] }),
      ),
    ],
  };
}
