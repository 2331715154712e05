/** Rates of a run, said in built-in functions. */
import { standardRowTexts } from './estimate';
import type { Given } from './given';
import { holdsOf } from './phrase';
import { Pairs } from './pairs';
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
    const distance = pairs.each(`${pairs.x}-${at}`);
    const terms = Array.from({ length: degree + 1 }, (_, n) =>
      n < 2 ? ['1', distance][n] : `${distance}^${n}`,
    );
    const fit = pairs.fit({ y: pairs.each(pairs.y), terms, weight: inside });
    const [k, size] = [degree + 1, pairs.size];
    const freedom = `(${points}-${k})`;
    const cells = standardRowTexts({
      value: `INDEX(${fit},1,${degree})/${nu}`,
      // LINEST counts the readings outside the window among its degrees of freedom
      uncertainty: `INDEX(${fit},2,${degree})*SQRT(${size - k}/${freedom})/ABS(${nu})`,
      degreesOfFreedom: freedom,
    });
    return cells.map((cell) => `IF(SUM(${inside})=${points},${cell},#VALUE!)`);
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
