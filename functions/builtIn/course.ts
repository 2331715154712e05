/** What is read off a run reading by reading, said in built-in functions. */
import type { Given } from './given';
import { holdsOf } from './phrase';
import { RisingRun } from './risingRun';
import { NotSaid, type Said } from './said';
import { where } from './text';

/** Σ[(cᵢ + cᵢ₋₁)/2]ᵝ(tᵢ − tᵢ₋₁) up to each reading. */
export function sayNormalTime(given: Given): Said {
  const run = new RisingRun(given);
  const exponent = given.number('exponent');
  const [b, all] = [exponent.text, run.pairs.size];
  const least = `MIN(${run.pairs.y})`;
  const allowed = `OR(AND(${b}>=0,${b}=INT(${b})),${least}>0,AND(${b}>0,${least}>=0))`;
  const holds = [...run.holds(false), ...holdsOf(exponent), allowed, `${run.time(all - 1)}>${run.time(0)}`];
  const isRow = run.pairs.columns > 1;
  return {
    cell(row, column) {
      const n = isRow ? column : row;
      if (n === 0) return where(holds, '0');
      const [before, after] = (['times', 'values'] as const).reduce<[string, string][]>(
        (list, of) => [...list, [run.stretch(of, 0, n - 1), run.stretch(of, 1, n)]],
        [],
      );
      const steps = `(${before[1]}-${before[0]})`;
      const means = `((${after[0]}+${after[1]})/2)`;
      const whole = `SUM(${means}^${b}*${steps})`;
      return where(holds, `IF(${b}=0,${run.time(n)}-${run.time(0)},${whole})`);
    },
  };
}

/** The times that each halving of the distance from the end took. */
export function sayHalvings(given: Given): Said {
  const run = new RisingRun(given);
  const { pairs } = run;
  const end = given.has('endpoint') ? given.number('endpoint') : undefined;
  const from = end?.text ?? '0';
  const first = `(${run.value(0)}-${from})`;
  const holds = [
    ...run.holds(true),
    ...holdsOf(...(end ? [end] : [])),
    // a rising column needs its end
    ...(end ? [] : [`OR(${pairs.trend()}<0,${level(pairs)})`]),
    `${first}<>0`,
  ];
  const shares = `(${pairs.y}-${from})/${first}`;
  const reached = (halving: number): string => {
    if (halving === 0) return run.time(0);
    const left = 0.5 ** halving;
    const placeOf = (share: number): string => `MIN(IF(${shares}<=${share},${run.places},${pairs.size + 1}))`;
    const place = placeOf(left);
    const share = (back: 0 | 1): string => `((INDEX(${pairs.y},${place}-${back})-${from})/${first})`;
    const time = (back: 0 | 1): string => `INDEX(${pairs.x},${place}-${back})`;
    const part = `IF(${share(0)}>0,LN(${share(1)}/${left})/LN(${share(1)}/${share(0)}),(${share(1)}-${left})/(${share(1)}-${share(0)}))`;
    const found = `${time(1)}+${part}*(${time(0)}-${time(1)})`;
    // a reading at or past the end ends the reckoning after the first level it meets
    const isOver = halving === 1 ? 'FALSE' : `AND(${place}=${placeOf(2 * left)},${share(0)}<=0)`;
    return `IF(${place}>${pairs.size},NA(),IF(${isOver},NA(),${found}))`;
  };
  if (pairs.size < 2) throw new NotSaid('fewer than two readings');
  return { cell: (row) => where(holds, `${reached(row + 1)}-${reached(row)}`) };
}

const level = ({ y }: { readonly y: string }): string => `MAX(${y})=MIN(${y})`;
