/** The course of a simple scheme (src/scheme/closedCourse.ts, with its source), said in built-in functions. */
import { closedFormOf, type ClosedForm } from '../../src/scheme/closedCourse';
import type { Scheme } from '../../src/scheme/scheme';
import type { Given } from './given';
import { NotSaid, type Said } from './said';
import { fixedArea, numberText, quoted, where } from './text';

export function sayCourse(given: Given): Said {
  const scheme = given.today<Scheme>('scheme');
  const form = closedFormOf(scheme);
  if (!form) throw new NotSaid('its scheme has no closed form and has to be integrated');
  const times = given.readings('times');
  const k = eachOf(given, 'coefficients', scheme.reactions.length);
  const initial = eachOf(given, 'initial', scheme.species.length);
  const holds = [
    ...asWritten(given),
    ...k.holds,
    ...initial.holds,
    ...times.none('<', '0'),
    `ISNUMBER(SUM(${times.whole}))`,
  ];
  const isTurned = times.columns > 1;
  return {
    cell(row, column) {
      const [place, species] = isTurned ? [column, row] : [row, column];
      const time = times.at(place);
      const height = heightOf(scheme, form, k.texts, initial.texts, time)(species);
      return where(holds, `IF(ISNUMBER(${time}),${height},"")`);
    },
  };
}

interface Each {
  readonly texts: readonly string[];
  readonly holds: readonly string[];
}

/** One cell each, which stays where it is. */
function eachOf(given: Given, name: string, count: number): Each {
  const readings = given.readings(name);
  if (readings.rows * readings.columns !== count) throw new NotSaid(`${name} are not one for each`);
  // a single one may be written in the formula
  if (count === 1 && !given.argument(name)?.area)
    return { texts: [readings.at(0)], holds: readings.none('<', '0') };
  return {
    texts: Array.from({ length: count }, (_, n) => (count === 1 ? readings.whole : readings.stretch(n, n))),
    holds: [`COUNT(${readings.whole})=${count}`, ...readings.none('<', '0')],
  };
}

/** That the scheme is still the one that the formula is built on. */
function asWritten(given: Given): string[] {
  const { area, cells = [] } = given.argument('scheme')!;
  if (!area) return [];
  return cells.flatMap((line, r) =>
    line.map((cell, c) => {
      const one = fixedArea({ ...area, row: area.row + r, column: area.column + c, rows: 1, columns: 1 });
      return `EXACT(${one},${quoted(String(cell ?? ''))})`;
    }),
  );
}

/** The concentration of a species at a time. */
function heightOf(
  { reactions }: Scheme,
  form: ClosedForm,
  k: readonly string[],
  initial: readonly string[],
  time: string,
): (species: number) => string {
  const { extents, a, b } = advanceOf(form, k, initial, time);
  return (species) => {
    if (species === form.a) return a;
    if ('b' in form && species === form.b) return b!;
    const gains = extents.flatMap((extent, step) => {
      const change = reactions[step].net.find((term) => term.species === species);
      return change ? [`${numberText(change.number)}*${extent}`] : [];
    });
    return [initial[species], ...gains].join('+');
  };
}

interface Advance {
  readonly extents: readonly string[];
  readonly a: string;
  readonly b?: string;
}

function advanceOf(form: ClosedForm, k: readonly string[], initial: readonly string[], t: string): Advance {
  const a = initial[form.a];
  const b = 'b' in form ? initial[form.b] : '';
  const left = (rate: string): string => `EXP(-(${rate}*${t}))`;
  switch (form.kind) {
    case 'first order': {
      const all = `(${k.join('+')})`;
      return { extents: k.map((one) => `${one}*${a}*${slowed(all, t)}`), a: `${a}*${left(all)}` };
    }
    case 'reversible': {
      const [both, sum] = [`(${k[0]}+${k[1]})`, `(${a}+${b})`];
      return {
        extents: [`(${k[0]}*${a}-${k[1]}*${b})*${slowed(both, t)}`],
        a: `${a}*${left(both)}+${k[1]}*${sum}*${slowed(both, t)}`,
        b: `${b}*${left(both)}+${k[0]}*${sum}*${slowed(both, t)}`,
      };
    }
    case 'consecutive': {
      const gained = `${numberText(form.gain)}*${k[0]}*${a}`;
      return {
        extents: [
          `${k[0]}*${a}*${slowed(k[0], t)}`,
          `${k[1]}*(${b}*${slowed(k[1], t)}+${gained}*${slowedTwice(k[0], k[1], t)})`,
        ],
        a: `${a}*${left(k[0])}`,
        b: `${b}*${left(k[1])}+${gained}*${between(k[0], k[1], t)}`,
      };
    }
    case 'one with itself': {
      const slowing = `(1+2*${k[0]}*${a}*${t})`;
      return { extents: [`${k[0]}*${a}^2*${t}/${slowing}`], a: `${a}/${slowing}` };
    }
    case 'one with another': {
      const [less, more] = [`MIN(${a},${b})`, `MAX(${a},${b})`];
      const rate = `(${k[0]}*(${more}-${less}))`;
      const pace = `(${k[0]}*${less}*${slowed(rate, t)})`;
      const rest = `${less}*${left(rate)}/(1+${pace})`;
      return {
        extents: [`${more}*${pace}/(1+${pace})`],
        a: `${rest}+(${a}-${less})`,
        b: `${rest}+(${b}-${less})`,
      };
    }
  }
}

/** (1 − exp(−λt))/λ; early on a series keeps its digits. */
function slowed(rate: string, t: string): string {
  const y = `(${rate}*${t})`;
  return `IF(${y}<0.001,${t}*(1-${y}/2+${y}^2/6-${y}^3/24+${y}^4/120),(1-EXP(-${y}))/${rate})`;
}

const orderedRates = (one: string, other: string): [string, string] => [
  `MIN(${one},${other})`,
  `MAX(${one},${other})`,
];

function between(one: string, other: string, t: string): string {
  const [less, more] = orderedRates(one, other);
  return `EXP(-(${less}*${t}))*${slowed(`(${more}-${less})`, t)}`;
}

function slowedTwice(one: string, other: string, t: string): string {
  const [less, more] = orderedRates(one, other);
  const [x, y] = [`(${one}*${t})`, `(${other}*${t})`];
  const early = `${t}^2/2*(1-(${x}+${y})/3+(${x}^2+${x}*${y}+${y}^2)/12)`;
  return `IF(${more}*${t}<0.0001,${early},(${slowed(less, t)}-${between(one, other, t)})/${more})`;
}
