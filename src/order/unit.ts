/** The unit of a rate coefficient, in words. */
import { InvalidInput, requireFinite } from '../errors';

interface Factor {
  readonly symbol: string;
  readonly power: number;
}

/**
 * Unit of k in −dc/dt = kcⁿ: (concentration)^(1−n) per time, as factors with their powers, positive first.
 *
 * @param order n
 * @param concentration unit as written, such as `mol/L`, `mmol L-1` or `kPa`
 * @param time unit, such as `s`
 * @returns such as `L mol⁻¹ s⁻¹`; with `^` where a power is not whole
 * @throws InvalidInput for a unit that cannot be read as factors
 * @see IUPAC Gold Book, order of reaction, doi:10.1351/goldbook.O04322
 * @example rateCoefficientUnit(2, 'mol/L', 's') // 'L mol⁻¹ s⁻¹'
 * @example rateCoefficientUnit(1, 'mol/L', 'min') // 'min⁻¹'
 */
export function rateCoefficientUnit(order: number, concentration: string, time: string): string {
  requireFinite({ order });
  const powers = new Map<string, number>();
  const add = ({ symbol, power }: Factor, times: number): void => {
    powers.set(symbol, (powers.get(symbol) ?? 0) + power * times);
  };
  factorsOf(concentration, 'concentrationunit').forEach((factor) => add(factor, 1 - order));
  factorsOf(time, 'timeunit').forEach((factor) => add(factor, -1));
  return written([...powers].map(([symbol, power]) => ({ symbol, power: tidy(power) })));
}

/** Powers such as 0.1 + 0.2 without their rounding. */
const tidy = (power: number): number => Number(power.toPrecision(12));

const factorText = /^([A-Za-zµμ°%Å]+[A-Za-z]*)(?:\^?([+−-]?\d+(?:\.\d+)?))?$/;
const raised: Readonly<Record<string, string>> = {
  '⁻': '-',
  '⁰': '0',
  '¹': '1',
  '²': '2',
  '³': '3',
  '⁴': '4',
  '⁵': '5',
  '⁶': '6',
  '⁷': '7',
  '⁸': '8',
  '⁹': '9',
};

function factorsOf(text: string, name: string): Factor[] {
  const plain = text.trim().replace(/[⁻⁰¹²³⁴-⁹]/g, (sign) => raised[sign]);
  const [above, ...below] = plain.split('/');
  const read = (part: string, sign: 1 | -1): Factor[] =>
    part
      .replace(/[()]/g, ' ')
      .split(/[\s·*]+/)
      .filter((word) => word !== '' && word !== '1')
      .map((word) => {
        const match = factorText.exec(word);
        if (!match) {
          throw new InvalidInput(`${name} must be made of units and powers, such as mol/L: got "${text}"`);
        }
        return {
          symbol: match[1],
          power: sign * Number((match[2] ?? '1').replace('−', '-')),
        };
      });
  const factors = [...read(above, 1), ...below.flatMap((part) => read(part, -1))];
  if (factors.length === 0) throw new InvalidInput(`${name} must name a unit: got "${text}"`);
  return factors;
}

function written(factors: readonly Factor[]): string {
  const kept = factors.filter(({ power }) => power !== 0);
  const isWhole = kept.every(({ power }) => Number.isInteger(power));
  return [...kept.filter(({ power }) => power > 0), ...kept.filter(({ power }) => power < 0)]
    .map(({ symbol, power }) =>
      power === 1 ? symbol : symbol + (isWhole ? superscript(power) : `^${power}`),
    )
    .join(' ');
}

const superscript = (power: number): string =>
  String(power).replace(/[-\d]/g, (sign) => (sign === '-' ? '⁻' : '⁰¹²³⁴⁵⁶⁷⁸⁹'[Number(sign)]));
