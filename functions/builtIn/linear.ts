/** Readings that follow concentration along a straight line, said in built-in functions. */
import { eachReading, placed } from './eachReading';
import type { Given } from './given';
import { differ, holdsOf, isNumberText, product } from './phrase';
import type { Said } from './said';

export function sayConversion(given: Given): Said {
  const [start, end] = [given.number('start'), given.number('end')];
  return eachReading(
    given.readings('readings'),
    [...holdsOf(start, end), ...differ(start.text, end.text)],
    (r) => `(${start.text}-${r})/(${start.text}-${end.text})`,
  );
}

export function sayConductivity(given: Given): Said {
  const [start, end, initial] = [given.number('start'), given.number('end'), given.number('initial')];
  const holds = [...holdsOf(start, end, initial), ...differ(start.text, end.text)];
  const left = (k: string): string => `${initial.text}*(1-(${start.text}-${k})/(${start.text}-${end.text}))`;
  const readings = given.readings('readings');
  if (!given.has('temperatures')) return eachReading(readings, holds, left);
  const temperature = given.quantities('temperatures', 'degC');
  const percent = given.number('percent');
  return eachReading(readings, [...holds, ...temperature.holds, ...percent.holds], (k, place) => {
    const { row, column } = temperature.isOne ? { row: 0, column: 0 } : placed(place);
    const factor = `(1+${percent.text}/100*(${temperature.at(row, column)}-25))`;
    return left(`IF(${factor}>0,${k}/${factor},#VALUE!)`);
  });
}

export function sayTitre(given: Given): Said {
  const [titrant, aliquot] = [given.quantity('titrant', 'mol/L'), given.quantity('aliquot', 'mL')];
  const ratio = given.number('ratio');
  return eachReading(
    given.readings('volumes'),
    holdsOf(titrant, aliquot, ratio),
    (v) => `${product(ratio.text, titrant.text, v)}/${aliquot.text}`,
  );
}

/** Beyond 5 % below nothing the start or the ratio cannot be right. */
export function sayRemaining(given: Given): Said {
  const formed = given.readings('formed');
  const [initial, ratio] = [given.number('initial'), given.number('ratio')];
  // judged before the ratio is: a 0 must not come in the way
  const perProduct = isNumberText(ratio.text) ? ratio.text : `IF(${ratio.text}>0,${ratio.text},1)`;
  const most = `1.05*${initial.text}${ratio.text === '1' ? '' : `/${perProduct}`}`;
  return eachReading(
    formed,
    [...holdsOf(initial, ratio), ...formed.none('>', most)],
    (x) => `${initial.text}-${product(ratio.text, x)}`,
  );
}

export function sayTotalPressure(given: Given): Said {
  const totals = given.readings('totals');
  const [start, gain] = [given.number('start'), given.number('gain')];
  const limit = `${start.text}*(1+1.05*${gain.text})`;
  // the total rises where gas is gained and falls where it is lost
  const notTooFar = isNumberText(gain.text)
    ? totals.none(gain.text.startsWith('(') ? '<' : '>', limit)
    : [`IF(${gain.text}>0,${totals.none('>', limit)},${totals.none('<', limit)})`];
  return eachReading(
    totals,
    [...holdsOf(start, gain), ...differ(gain.text, '0'), ...notTooFar],
    (p) => `${start.text}-(${p}-${start.text})/${gain.text}`,
  );
}

export function sayAbsorbance(given: Given): Said {
  const readings = given.readings('readings');
  const [absorptivity, blank] = [given.number('absorptivity'), given.number('blank')];
  const path = given.quantity('path', 'cm');
  const holds = holdsOf(absorptivity, path, blank);
  const net = (a: string): string => (blank.text === '0' ? a : `(${a}-${blank.text})`);
  if (!given.has('product')) {
    const positive = isNumberText(absorptivity.text) ? [] : [`${absorptivity.text}>0`];
    return eachReading(
      readings,
      [...holds, ...positive],
      (a) => `${net(a)}/${path.text === '1' ? absorptivity.text : `(${absorptivity.text}*${path.text})`}`,
    );
  }
  const [other, total] = [given.number('product'), given.quantity('total', 'mol/L')];
  return eachReading(
    readings,
    [...holds, ...holdsOf(other, total), ...differ(absorptivity.text, other.text)],
    (a) => `(${net(a)}/${path.text}-${other.text}*${total.text})/(${absorptivity.text}-${other.text})`,
  );
}

/** Time until an event: change/(νt), which is 1/t where nothing else is known. */
export function sayEvent(given: Given): Said {
  const times = given.readings('times');
  const change = given.has('change') ? given.number('change') : undefined;
  const own = change?.text ?? '1';
  const coefficient = given.has('coefficient') ? given.number('coefficient') : undefined;
  const number = coefficient?.text ?? (change ? `SIGN(${own})` : '1');
  return eachReading(
    times,
    [
      ...holdsOf(...(change ? [change] : []), ...(coefficient ? [coefficient] : [])),
      ...differ(own, '0'),
      ...(coefficient ? differ(number, '0') : []),
    ],
    (t) => `${own}/${number === '1' ? t : `(${number}*${t})`}`,
  );
}
