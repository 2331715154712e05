/** Rate coefficients over temperature, said in built-in functions. */
import { boltzmannConstant, celsiusZero, gasConstant, planckConstant } from '../../src/constants';
import { holdingTimes } from '../../src/temperature/meanKinetic';
import { temperatureRounding } from '../../src/temperature/measured';
import { standardRowTexts } from './estimate';
import type { Given } from './given';
import { OneTime } from './oneTime';
import { holdsOf } from './phrase';
import { Pairs } from './pairs';
import { SortedRun } from './sortedRun';
import { oneValue, type Said } from './said';
import { numberText, where } from './text';
import { headingRow, workingFormula, type WorkingCell } from './workings';

/** ln(k/scale) as a straight line in 1/T − 1/centre, by weighted least squares. */
class LineOverTemperature {
  readonly holds: readonly string[];
  private readonly pairs: Pairs;
  private readonly weight: string;

  constructor(
    given: Given,
    private readonly scale: 'none' | 'temperature',
  ) {
    const pairs = Pairs.of(given, 'temperatures', 'coefficients');
    const celsius = given.quantityReadings('temperatures');
    this.pairs = pairs;
    const { weight, holds } = this.weights(given);
    this.weight = weight;
    const kelvin = pairs.some(pairs.x);
    this.holds = [
      ...pairs.holds,
      ...celsius.holds,
      // all above 200 °C look like kelvin, and are refused
      ...celsius.none('<=', '200').map((hold) => hold.replace(/=0$/, '>0')),
      `SUM(${pairs.each(`IF(${pairs.y}<=0,1,0)`)})=0`,
      `(MAX(${kelvin})-MIN(${kelvin}))*${Math.round(1 / temperatureRounding)}>=1`,
      ...holds,
    ];
  }

  private weights(given: Given): { weight: string; holds: string[] } {
    const { both, y } = this.pairs;
    const uncertainties = given.argument('uncertainties');
    if (!uncertainties || given.isWord('uncertainties', 'relative')) return { weight: both, holds: [] };
    const u = Pairs.of(given, 'coefficients', 'uncertainties').y;
    return {
      weight: this.pairs.each(`${y}/${u}`),
      holds: [`0*SUM(${u})+SUM(${this.pairs.each(`IF(ISNUMBER(${u}),IF(${u}>0,0,1),1)`)})=0`],
    };
  }

  get degreesOfFreedom(): string {
    return `(${this.pairs.count}-2)`;
  }

  /** The row 1 (value) or 2 (standard uncertainty) of what the line has at a temperature. */
  height(row: 1 | 2, perKelvin: string): string {
    return this.part(row, 2, perKelvin);
  }

  /** The same of its slope, K. */
  slope(row: 1 | 2): string {
    return this.part(row, 1, '0');
  }

  /** Lowest and highest temperature, °C. */
  get range(): [string, string] {
    const all = this.pairs.some(this.pairs.x);
    return [`MIN(${all})`, `MAX(${all})`];
  }

  private part(row: 1 | 2, column: 1 | 2, centre: string): string {
    const { pairs, weight } = this;
    const kelvin = `(${pairs.x}+${celsiusZero})`;
    const y = pairs.each(`LN(${pairs.y}${this.scale === 'none' ? '' : `/${kelvin}`})`);
    const x = pairs.each(`1/${kelvin}${centre === '0' ? '' : `-${centre}`}`);
    const value = `INDEX(${pairs.fit({ y, terms: ['1', x], weight })},${row},${column})`;
    // LINEST counts pairs with a gap among its degrees of freedom
    return row === 1 ? value : `${value}*SQRT(${pairs.size - 2}/${this.degreesOfFreedom})`;
  }
}

/** value = factor × what the line has + offset. */
function scaled(line: LineOverTemperature, of: (row: 1 | 2) => string, factor: number, offset = 0): string[] {
  const sum = offset === 0 ? '' : `+${numberText(offset)}`;
  return standardRowTexts({
    value: `(${numberText(factor)}*${of(1)}${sum})`,
    uncertainty: `${numberText(Math.abs(factor))}*${of(2)}`,
    degreesOfFreedom: line.degreesOfFreedom,
  });
}

/** Fewer than two pairs tell nothing. */
function table(line: LineOverTemperature, holds: readonly string[], rows: readonly string[][]): Said {
  const enough = `${line.degreesOfFreedom}>=0`;
  return {
    cell: (row, column) => where([...line.holds, ...holds], `IF(${enough},${rows[row][column]},NA())`),
  };
}

export function sayArrhenius(given: Given): Said {
  const line = new LineOverTemperature(given, 'none');
  const detail = given.flag('detail');
  const rows = [
    scaled(line, (row) => line.slope(row), -gasConstant / 1000),
    scaled(line, (row) => line.height(row, '0'), 1),
  ];
  return table(line, detail.holds, detail.value ? rows : [[rows[0][0]]]);
}

/** ln(kB/h), of k in 1/(K s). */
const universal = Math.log(boltzmannConstant / planckConstant);

export function sayEyring(given: Given): Said {
  const line = new LineOverTemperature(given, 'temperature');
  const detail = given.flag('detail');
  const gibbs = (-gasConstant * 298.15) / 1000;
  const rows = [
    scaled(line, (row) => line.slope(row), -gasConstant / 1000),
    scaled(line, (row) => line.height(row, '0'), gasConstant, -gasConstant * universal),
    scaled(line, (row) => line.height(row, '1/298.15'), gibbs, -gibbs * universal),
  ];
  return table(line, detail.holds, detail.value ? rows : [rows.map(([value]) => value)]);
}

export function sayCoefficientAt(given: Given): Said {
  const line = new LineOverTemperature(given, 'none');
  const [temperature, detail] = [given.quantity('temperature', 'K'), given.flag('detail')];
  const at = temperature.text;
  const [value, u] = [`EXP(${line.height(1, `1/${at}`)})`, line.height(2, `1/${at}`)];
  const freedom = line.degreesOfFreedom;
  const limit = (sign: '+' | '-'): string =>
    `IF(${freedom}>0,${value}*EXP(${sign === '-' ? '-' : ''}TINV(0.05,${freedom})*${u}),NA())`;
  const [lowest, highest] = line.range;
  const celsius = `(${at}-${celsiusZero})`;
  const outside = `IF(OR(${celsius}<${lowest}-${numberText(temperatureRounding)},${celsius}>${highest}+${numberText(temperatureRounding)}),"extrapolated","")`;
  const rows = [value, `IF(${freedom}>0,${value}*${u},NA())`, limit('-'), limit('+'), freedom, outside];
  // a bare number far above the others can be kelvin, which PACE judges beside them
  const holds = [
    ...temperature.holds,
    ...detail.holds,
    ...(given.isNumber('temperature') ? [`${celsius}<=200`] : []),
  ];
  return table(line, holds, detail.value ? [rows] : [[value]]);
}

export function sayMeanTemp(given: Given): Said {
  const celsius = given.quantityReadings('temperatures');
  const energy = given.quantity('energy', 'J/mol');
  const t = celsius.whole;
  const perKelvin = `${energy.text}/${gasConstant}`;
  const plausible = celsius.none('<=', '200').map((hold) => hold.replace(/=0$/, '>0'));
  const holds = [`${celsius.doubt}=0`, ...celsius.holds, ...plausible, ...energy.holds];
  const of = (temperatures: string, mean: (share: string) => string): string => {
    // from the highest temperature down, so that no exponential vanishes
    const highest = `(MAX(${temperatures})+${celsiusZero})`;
    const share = `EXP(${perKelvin}*(1/${highest}-1/(${temperatures}+${celsiusZero})))`;
    return `1/(1/${highest}-LN(${mean(share)})/(${perKelvin}))-${celsiusZero}`;
  };
  if (!given.has('times')) {
    return oneValue(
      where(
        holds,
        of(t, (share) => `SUM(IF(ISNUMBER(${t}),${share},0))/COUNT(${t})`),
      ),
    );
  }
  const run = new SortedRun(given, 'times', 'temperatures');
  const held = heldIn(given, run);
  const mean = of(run.values, (share) => `SUM(IF(ISNUMBER(${run.times}),${held}*${share},0))/SUM(${held})`);
  // a single reading is its own mean
  const whole = `IF(${run.count}=1,${run.value(0)},${where([`${run.different}>1`], mean)})`;
  return oneValue(where([...holds, ...run.holds], whole));
}

/** How long each reading stands for: from halfway to the time before until halfway to the next, shared by those of one time. */
function heldIn(given: Given, run: SortedRun): string {
  const { times, size, today } = run;
  const oneTime = new OneTime(given, run);
  const table = given.workings.table(`Time that each reading stands for: ${run.name}`, () => {
    const held = today && holdingTimes(today.times);
    return [
      headingRow('stands for'),
      ...Array.from({ length: size }, (_, n): WorkingCell[] => {
        const before = `INDEX(${times},MAX(1,${oneTime.first(n)}-1))`;
        const next = `INDEX(${times},MIN(${run.count},${oneTime.last(n)}+1))`;
        const own = run.known(n, `(${next}-${before})/2/${oneTime.count(n)}`);
        return [workingFormula(own, held && (held[n] ?? ''))];
      }),
    ];
  });
  return table.range(1, 0, size);
}

export function sayTimeTo(given: Given): Said {
  const [fraction, k, order] = [given.number('fraction'), given.number('coefficient'), given.number('order')];
  const span = `-LN(1-${fraction.text})`;
  const first = `(${span})/${k.text}`;
  const holds = holdsOf(fraction, k, order);
  if (!given.has('initial')) {
    return oneValue(where([...holds, ...(order.text === '1' ? [] : [`${order.text}=1`])], first));
  }
  const initial = given.number('initial');
  // (e^z − 1)/z keeps its digits near order 1 by its series
  const z = `((${order.text}-1)*(${span}))`;
  const departure = `IF(ABS(${z})<0.0001,1+${z}/2+${z}^2/6+${z}^3/24,(EXP(${z})-1)/${z})`;
  const time = `(${span})*${departure}/(${k.text}*${initial.text}^(${order.text}-1))`;
  if (order.text === '1') return oneValue(where([...holds, ...initial.holds], first));
  // what is left to go wrong is a time too long for a cell
  return oneValue(where([...holds, ...initial.holds], `IF(${order.text}=1,${first},IFERROR(${time},NA()))`));
}
