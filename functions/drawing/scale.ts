/** From numbers to places in a drawing. */

export interface Scale {
  readonly from: number;
  readonly to: number;
  place(value: number): number;
}

export function linearScale(
  [from, to]: readonly [number, number],
  [start, end]: readonly [number, number],
): Scale {
  const share = (end - start) / (to - from || 1);
  return { from, to, place: (value) => start + (value - from) * share };
}

/** Steps of 1, 2 or 5 times a power of ten, so that about `count` fit. */
export function tickStep(span: number, count: number): number {
  const rough = span / count;
  const power = 10 ** Math.floor(Math.log10(rough));
  const step = [1, 2, 5, 10].find((multiple) => multiple * power >= rough * (1 - 1e-9)) ?? 10;
  return step * power;
}

/** Round numbers within the range, both ends included where they are round. */
export function ticks(from: number, to: number, count: number): number[] {
  const step = tickStep(to - from, count);
  const first = Math.ceil(from / step - 1e-9);
  const last = Math.floor(to / step + 1e-9);
  return Array.from({ length: Math.max(0, last - first + 1) }, (_, i) => roundTo((first + i) * step, step));
}

/** 0.30000000000000004 → 0.3: a tick has no more decimals than its step. */
const roundTo = (value: number, step: number): number =>
  Number(value.toFixed(Math.min(100, Math.max(0, 1 - Math.floor(Math.log10(step))))));

/** The smallest round range that holds all values, with room when they are all the same. */
export function roundRange(values: readonly number[], count: number): [number, number] {
  let low = Infinity;
  let high = -Infinity;
  for (const value of values) {
    if (value < low) low = value;
    if (value > high) high = value;
  }
  if (low > high) return [0, 1];
  if (low === high) [low, high] = [low - (Math.abs(low) || 1) / 2, high + (Math.abs(high) || 1) / 2];
  const step = tickStep(high - low, count);
  return [Math.floor(low / step + 1e-9) * step, Math.ceil(high / step - 1e-9) * step];
}
