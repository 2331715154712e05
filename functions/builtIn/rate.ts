/** Rates of a run, said in built-in functions. */
import { standardRowTexts } from './estimate';
import type { Given } from './given';
import { holdsOf } from './phrase';
import { Pairs } from './pairs';
import { RisingRun } from './risingRun';
import { NotSaid, oneValue, type Said } from './said';
import { where } from './text';

export function sayBetween(given: Given): Said {
  if (given.flag('detail').value)
    throw new NotSaid('the scatter of single readings, for detail, has no counterpart');
  const pairs = Pairs.of(given, 'times', 'values');
  const [from, to] = [given.number('from'), given.number('to')];
  const nu = pairs.stoichiometricNumber(given);
  const change = `${interpolated(pairs, to.text)}-${interpolated(pairs, from.text)}`;
  const rate = `(${change})/(${nu.text}*(${to.text}-${from.text}))`;
  const inside = `IF(AND(${pairs.within(from.text)},${pairs.within(to.text)}),${rate},NA())`;
  return oneValue(
    where(
      [...pairs.holds, ...holdsOf(from, to, nu), ...given.flag('detail').holds, `${from.text}<>${to.text}`],
      inside,
    ),
  );
}

/** y at a time: between the means of the readings just before and just after. */
function interpolated(pairs: Pairs, at: string): string {
  const { x, y } = pairs;
  const before = `MAX(${pairs.some(`IF(${x}<=${at},${x},"")`)})`;
  const after = `MIN(${pairs.some(`IF(${x}>=${at},${x},"")`)})`;
  const mean = (time: string): string =>
    `SUM(${pairs.each(`IF(${x}=${time},${y},0)`)})/SUM(${pairs.each(`IF(${x}=${time},1,0)`)})`;
  const share = `IF(${after}=${before},0,(${at}-${before})/(${after}-${before}))`;
  return `(${mean(before)}+(${mean(after)}-${mean(before)})*${share})`;
}

interface Slope {
  /** 1 for each reading that counts. */
  readonly inside: string;
  readonly points: string;
  readonly at: string;
  readonly degree: number;
  readonly nu: string;
}

/** The slope of a polynomial through some readings, as a rate: the five cells of the standard row. */
function slopeRow(pairs: Pairs, { inside, points, at, degree, nu }: Slope): string[] {
  const distance = pairs.each(`${pairs.x}-${at}`);
  const terms = ['1', distance, ...Array.from({ length: degree - 1 }, (_, n) => `${distance}^${n + 2}`)];
  const fit = pairs.fit({ y: pairs.each(pairs.y), terms, weight: inside });
  const [k, size] = [degree + 1, pairs.size];
  const freedom = `(${points}-${k})`;
  return standardRowTexts({
    value: `INDEX(${fit},1,${degree})/${nu}`,
    // LINEST counts the readings outside among its degrees of freedom
    uncertainty: `INDEX(${fit},2,${degree})*SQRT(${size - k}/${freedom})/ABS(${nu})`,
    degreesOfFreedom: freedom,
  });
}

/** A tangent in a window whose number of readings is given. */
class Tangent {
  readonly holds: readonly string[];
  private readonly nu: string;
  private readonly points: string;
  private readonly degree: number;

  constructor(
    given: Given,
    private readonly pairs: Pairs,
  ) {
    if (!given.has('points'))
      throw new NotSaid(
        'the number of readings for a tangent is chosen from the data, which no built-in function does',
      );
    const [points, degree] = [given.number('points'), given.constant('degree')];
    const nu = pairs.stoichiometricNumber(given);
    this.points = points.text;
    this.degree = degree.value;
    this.nu = nu.text;
    this.holds = [
      ...pairs.holds,
      ...holdsOf(points, nu),
      ...degree.holds,
      `${this.points}>${this.degree}`,
      `${this.points}<=${pairs.count}`,
    ];
  }

  /** The five cells of the standard row at a time. */
  row(at: string): string[] {
    const { pairs, points, degree, nu } = this;
    const inside = this.window(at);
    return slopeRow(pairs, { inside, points, at, degree, nu }).map(
      (cell) => `IF(SUM(${inside})=${points},${cell},#VALUE!)`,
    );
  }

  /** 1 for each of the nearest readings; of two as far off on either side the earlier. */
  private window(at: string): string {
    const { pairs, points } = this;
    const away = `ABS(${pairs.x}-${at})`;
    const reach = `SMALL(${pairs.some(away)},${points})`;
    const tied = `IF(SUM(${pairs.each(`IF(${away}<=${reach},1,0)`)})=${points},1,IF(${pairs.x}<${at},1,0))`;
    return pairs.each(`IF(${away}<${reach},1,IF(${away}>${reach},0,${tied}))`);
  }
}

export function sayTangent(given: Given): Said {
  const pairs = Pairs.of(given, 'times', 'values');
  const [tangent, time, detail] = [new Tangent(given, pairs), given.number('time'), given.flag('detail')];
  const say = (column: number): string =>
    where(
      [...tangent.holds, ...time.holds, ...detail.holds],
      `IF(${pairs.within(time.text)},${tangent.row(time.text)[column]},NA())`,
    );
  if (!detail.value) return oneValue(say(0));
  return { cell: (_, column) => say(column) };
}

export function sayAlong(given: Given): Said {
  const [times, values] = [given.quantityReadings('times'), given.quantityReadings('values')];
  const pairs = Pairs.of(given, 'times', 'values');
  const [tangent, detail] = [new Tangent(given, pairs), given.flag('detail')];
  const isRow = times.rows === 1 && times.columns > 1;
  return {
    cell(row, column) {
      const [n, part] = isRow ? [column, row] : [row, column];
      const place: [number, number] = isRow ? [0, n] : [n, 0];
      const [time, value] = [times.element(...place), values.element(...place)];
      const isPair = `ISNUMBER(${time})*ISNUMBER(${value})`;
      return where([...tangent.holds, ...detail.holds], `IF(${isPair},${tangent.row(time)[part]},"")`);
    },
  };
}

/** A parabola, and two readings to judge its scatter by. */
const fewest = 5;

/** The initial rate of a run without gaps, in the order of its times. */
export function sayStart(given: Given): Said {
  const run = new RisingRun(given);
  const { pairs } = run;
  const [share, nu, detail] = [
    given.number('share'),
    pairs.stoichiometricNumber(given),
    given.flag('detail'),
  ];
  const all = pairs.size;
  const few = Math.max(1, Math.min(3, Math.floor(all / 5)));
  const [first, last] = [run.value(0), run.stretch('values', all - few, all - 1)];
  const limit = `${share.text}*ABS(AVERAGE(${last})-${first})`;
  const beyond = `MIN(IF(ABS(${pairs.y}-${first})>${limit},${run.places},${all + 1}))-1`;
  const points = `MIN(${all},MAX(${fewest},${beyond}))`;
  const inside = `IF(${run.places}<=${points},1,0)`;
  const cells = slopeRow(pairs, { inside, points, at: run.time(0), degree: 2, nu: nu.text });
  const say = (column: number): string =>
    where([...run.holds(true), ...holdsOf(share, nu), ...detail.holds], cells[column]);
  if (all < 3) throw new NotSaid('fewer than three readings');
  if (!detail.value) return oneValue(say(0));
  return { cell: (_, column) => say(column) };
}
