/** Gas caught, kept or lost, said in built-in functions. */
import { gasConstant, standardGravity } from '../../src/constants';
import { dissolvingGases, henryCoefficients } from '../../src/signal/henry';
import { molarMass } from '../../src/signal/molarMass';
import { criticalTemperature } from '../../src/signal/water';
import { convertUnit } from '../../src/units';
import { eachReading, placed, type Place } from './eachReading';
import type { Given, Quantities } from './given';
import { holdsOf, isNumberText, product, type Phrase } from './phrase';
import { NotSaid, type Said } from './said';
import { numberText, where } from './text';
import { liquidHolds, saturationPressureText, vapourHolds, waterDensityText } from './water';

const at = (quantity: Quantities, place: Place | undefined): string => {
  const { row, column } = quantity.isOne ? { row: 0, column: 0 } : placed(place);
  return quantity.at(row, column);
};

export function sayGasVolume(given: Given): Said {
  const [temperature, pressure] = [given.quantities('temperature', 'K'), given.quantities('pressure', 'Pa')];
  const [wet, head, unit] = [given.fraction('wet'), given.quantity('head', 'm'), given.word('unit')];
  const cubicMetres = numberText(convertUnit(1, unit.value, 'mL', 'volumes') * 1e-6);
  const holds = [...temperature.holds, ...pressure.holds, ...holdsOf(wet, head), ...unit.holds];
  return eachReading(given.readings('volumes'), holds, (v, place) => {
    const [t, p] = [at(temperature, place), at(pressure, place)];
    const taken = [...column(t, head), ...vapour(t, wet)];
    const dry = [p, ...taken.map(({ text }) => text)].join('-');
    const amount = `${taken.length > 0 ? `(${dry})` : p}*${v}*${cubicMetres}/(${gasConstant}*${t})`;
    return taken.length > 0 ? where([onlyWhere(holdsOf(...taken), `${dry}>0`)], amount) : amount;
  });
}

/** A condition that cannot be worked out unless others hold. */
const onlyWhere = (holds: readonly string[], then: string): string =>
  `IF(AND(${holds.join(',')}),${then},FALSE)`;

/** The water that stands in the tube. */
function column(t: string, head: Phrase): Phrase[] {
  if (head.text === '0') return [];
  const text = `${waterDensityText(t)}*${standardGravity}*${head.text}`;
  const liquid = liquidHolds(t);
  if (isNumberText(head.text)) return [{ text, holds: liquid }];
  return [{ text: `IF(${head.text}=0,0,${text})`, holds: [`OR(${head.text}=0,AND(${liquid.join(',')}))`] }];
}

function vapour(t: string, wet: Phrase): Phrase[] {
  if (wet.text === '0') return [];
  const text = product(wet.text, saturationPressureText(t));
  const holds = vapourHolds(t);
  if (isNumberText(wet.text)) return [{ text, holds }];
  return [{ text: `IF(${wet.text}=0,0,${text})`, holds: [`OR(${wet.text}=0,AND(${holds.join(',')}))`] }];
}

export function sayGasPressure(given: Given): Said {
  const pressures = given.readings('pressures');
  const temperature = given.quantities('temperature', 'K');
  const [volume, unit] = [given.quantity('volume', 'm^3'), given.word('unit')];
  const pascal = numberText(convertUnit(1, unit.value, 'kPa', 'pressures') * 1000);
  const first = pressures.first;
  const start = given.has('start') ? given.quantityIn('start', unit.value) : first;
  const from = `${start.text}*${pascal}/${temperature.at(first.row, first.column)}`;
  const holds = [...temperature.holds, ...holdsOf(volume, first, start), ...unit.holds];
  return eachReading(
    pressures,
    holds,
    (p, place) => `${volume.text}/${gasConstant}*(${p}*${pascal}/${at(temperature, place)}-${from})`,
  );
}

export function sayDissolved(given: Given): Said {
  const [gas, volume, temperature] = [
    given.word('gas'),
    given.quantity('volume', 'm^3'),
    given.quantity('temperature', 'K'),
  ];
  const known = henryCoefficients(gas.value);
  if (!known) throw new NotSaid(`gas is none of ${dissolvingGases.join(', ')}`);
  const [a, b, c] = known.map(numberText);
  const t = temperature.text;
  const reduced = `(${t}/${criticalTemperature})`;
  const tau = `(1-${reduced})`;
  const henry = `(${saturationPressureText(t)}*EXP((${a}+${b}*${tau}^0.355)/${reduced}+${c}*${reduced}^-0.41*EXP(${tau})))`;
  const perPressure = `${waterDensityText(t)}/${numberText(molarMass('H2O') * 1e-3)}/${henry}`;
  return eachReading(
    given.quantityReadings('pressure'),
    [...gas.holds, ...holdsOf(volume, temperature)],
    (p) => `${given.inUnit('pressure', p, 'Pa')}*${volume.text}*${perPressure}`,
  );
}

/** The reach of 95 % of a normal distribution, in standard deviations. */
const reach = 'NORMSINV(0.975)';

export function sayMassLoss(given: Given): Said {
  const masses = given.readings('masses');
  const start = given.has('start') ? given.number('start') : masses.first;
  const perMole = molarMassText(given);
  const readability = given.has('readability') ? given.number('readability') : undefined;
  const detail = given.flag('detail');
  const u = readability && `${readability.text}/SQRT(6)`;
  const [hidden] = u ? masses.none('<=', `${start.text}-3.29*${u}`) : [];
  const visible = hidden?.replace(/=0$/, '>0');
  const holds = [...holdsOf(start, perMole), ...(readability?.holds ?? []), ...detail.holds];
  const amount = (m: string): string => `(${start.text}-${m})/${perMole.text}`;
  if (!detail.value) return eachReading(masses, holds, amount, visible);
  const cells = (m: string): string[] => {
    if (!u) return [amount(m), 'NA()', 'NA()', 'NA()', 'NA()'];
    const own = `${u}/${perMole.text}`;
    return [amount(m), own, `${amount(m)}-${reach}*${own}`, `${amount(m)}+${reach}*${own}`, '"∞"'];
  };
  const isRow = masses.rows === 1 && masses.columns > 1;
  const say = (n: number): Said => eachReading(masses, holds, (m) => cells(m)[n], visible);
  return { cell: (row, column) => (isRow ? say(row).cell!(0, column) : say(column).cell!(row, 0)) };
}

/** Of what leaves with each mole of gas: the gas itself, and the water vapour it carries. */
function molarMassText(given: Given): Phrase {
  const gas = molarMassOf(given);
  if (!given.has('temperature')) return gas;
  const [temperature, pressure] = [given.quantity('temperature', 'K'), given.quantity('pressure', 'Pa')];
  const vapour = saturationPressureText(temperature.text);
  return {
    text: `(${gas.text}+${numberText(molarMass('H2O'))}*${vapour}/(${pressure.text}-${vapour}))`,
    holds: [
      ...holdsOf(gas, temperature, pressure),
      onlyWhere(vapourHolds(temperature.text), `${pressure.text}>${vapour}`),
    ],
  };
}

function molarMassOf(given: Given): Phrase {
  if (given.isNumber('gas')) {
    const { text, holds } = given.number('gas');
    return { text, holds: isNumberText(text) ? holds : [...holds, `${text}>0`] };
  }
  const { value, holds } = given.word('gas');
  return { text: numberText(molarMass(value)), holds };
}
