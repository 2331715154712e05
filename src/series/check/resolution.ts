import type { Course } from './course';
import type { Finding } from './finding';
import { smallestStep, spread } from './scatter';
import { percent, roughly } from './words';

/** The whole change in fewer steps than this is coarse: rounding is then 1 % of it or more. */
const stepsWanted = 30;

/** So many neighbours in time that read the same show that the reaction moves less than a step between them. */
const leastEqual = 2;
const leastEqualShare = 0.2;

/**
 * Readings near the resolution of the instrument. Rule: the whole change is less than 30 times the smallest
 * step between readings, and a fifth of the readings before any plateau, two at least, equal the one before.
 *
 * Rounding to a step q adds a standard deviation of q/√12 (GUM, JCGM 100:2008, F.2.2.1).
 */
export function resolution({ series }: Course, plateauFrom: number | undefined): Finding | null {
  const { values, places } = series;
  const changing = values.subarray(0, plateauFrom ?? restFrom(values));
  const step = smallestStep(values);
  const steps = spread(values) / step;
  if (changing.length < 5 || step === 0 || steps >= stepsWanted) return null;
  const equal = [...changing.keys()].filter((i) => i > 0 && changing[i] === changing[i - 1]);
  if (equal.length < Math.max(leastEqual, leastEqualShare * (changing.length - 1))) return null;
  return {
    kind: 'resolution',
    places: equal.map((i) => places[i]).sort((a, b) => a - b),
    finding: `the readings change in steps of ${roughly(step)}, and the whole change is only ${roughly(steps)} steps; ${equal.length} readings equal the one before`,
    meaning: `rounding alone is ${percent(1 / (steps * Math.sqrt(12)))} of the change: tangents over few readings jump between 0 and too much, and their uncertainty is not to be trusted`,
    advice: 'read more finely, or less often; let a tangent rest on many readings, or fit the whole run',
  };
}

/** Where the readings at the end begin to be all equal: the run is over there, however fine the instrument. */
function restFrom(values: Float64Array): number {
  let first = values.length - 1;
  while (first > 0 && values[first - 1] === values[first]) first--;
  return first + 1;
}
