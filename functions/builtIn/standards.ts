/** A calibration line read backwards, said in built-in functions. */
import { eachReading, type Place } from './eachReading';
import { standardRowTexts } from './estimate';
import type { Given } from './given';
import { Pairs } from './pairs';
import type { Said } from './said';
import { standardWeights, type StandardWeights } from './standardWeights';

export function sayStandards(given: Given): Said {
  const pairs = Pairs.of(given, 'concentrations', 'standards');
  const [origin, detail, replicates] = [
    given.flag('origin'),
    given.flag('detail'),
    given.number('replicates'),
  ];
  const readings = given.readings('readings');
  const weights = standardWeights(given, pairs);
  const line = calibration(pairs, weights, origin.value);
  const holds = [...pairs.holds, ...weights.holds, ...origin.holds, ...detail.holds, ...replicates.holds];
  const isRow = readings.rows === 1 && readings.columns > 1;
  const cells = (y: string, place: Place | undefined): string[] => {
    const value = `(${y}-${line.intercept})/${line.slope}`;
    const own = detail.value && place ? weights.at(isRow ? place.column : place.row) : '1';
    const variance = own === '1' ? '1' : `${own}^2`;
    const scatter = `SQRT(${variance}/${replicates.text}+${line.leverage(value)})`;
    return standardRowTexts({
      value,
      uncertainty: `${line.deviation}/ABS(${line.slope})*${scatter}`,
      degreesOfFreedom: line.degreesOfFreedom,
    });
  };
  const say = (n: number): Said =>
    eachReading(
      readings,
      holds,
      (y, place) => `IF(AND(${line.isClear},${line.covers(y)}),${cells(y, place)[n]},NA())`,
      line.isEnough,
    );
  if (!detail.value) return say(0);
  return { cell: (row, column) => (isRow ? say(row).cell!(0, column) : say(column).cell!(row, 0)) };
}

interface Calibration {
  readonly slope: string;
  readonly intercept: string;
  /** Of a single reading about the line. */
  readonly deviation: string;
  readonly degreesOfFreedom: string;
  /** That there are standards enough for a line. */
  readonly isEnough: string;
  /** That the slope can be told from 0. */
  readonly isClear: string;
  /** That a reading lies among the standards, or up to a tenth of their range beyond. */
  covers(reading: string): string;
  /** What the line itself adds, in units of a reading's variance. */
  leverage(concentration: string): string;
}

function calibration(pairs: Pairs, { root, square }: StandardWeights, throughOrigin: boolean): Calibration {
  const x = pairs.each(pairs.x);
  const terms = throughOrigin ? [x] : ['1', x];
  const fit = pairs.fit({ y: pairs.each(pairs.y), terms, weight: root });
  const degreesOfFreedom = `(${pairs.count}-${terms.length})`;
  // LINEST counts pairs with a gap among its degrees of freedom
  const share = `SQRT(${pairs.size - terms.length}/MAX(1,${degreesOfFreedom}))`;
  const slope = `INDEX(${fit},1,1)`;
  const reach = `IF(${degreesOfFreedom}>0,TINV(0.05,MAX(1,${degreesOfFreedom}))*INDEX(${fit},2,1)*${share},0)`;
  const [low, high] = ['MIN', 'MAX'].map((f) => `${f}(${throughOrigin ? '0,' : ''}${pairs.some(pairs.y)})`);
  const weighted = (text: string): string => `SUM(${square ? `${square}*` : ''}${text})`;
  const weight = square ? `SUM(${square})` : pairs.count;
  const centre = throughOrigin ? '0' : `${weighted(x)}/${weight}`;
  const spread = weighted(pairs.each(`(${pairs.x}-${centre})^2`));
  return {
    slope,
    intercept: throughOrigin ? '0' : `INDEX(${fit},1,2)`,
    deviation: `INDEX(${fit},3,2)*${share}`,
    degreesOfFreedom,
    isEnough: throughOrigin ? `${spread}>0` : `${pairs.different}>1`,
    isClear: `ABS(${slope})>${reach}`,
    covers: (y) => `${y}>=${low}-0.1*(${high}-${low}),${y}<=${high}+0.1*(${high}-${low})`,
    leverage: (value) => `${throughOrigin ? '' : `1/${weight}+`}(${value}-${centre})^2/${spread}`,
  };
}
