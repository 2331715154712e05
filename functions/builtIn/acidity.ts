/** An ion's concentration from a pH, said in built-in functions. */
import { waterIonProduct } from '../../src/signal/acidity';
import { debyeHueckelSlope } from '../../src/signal/activity';
import { eachReading } from './eachReading';
import type { Given } from './given';
import { NotSaid, type Said } from './said';
import { numberText } from './text';

export function sayAcidity(given: Given): Said {
  const species = given.word('species');
  const isAcid = /^H[+⁺]?$/i.test(species.value);
  const hasIons = given.has('ionicstrength');
  const temperature = given.quantity('temperature', 'K');
  if (temperature.holds.length > 0 && (hasIons || !isAcid))
    throw new NotSaid('the equations for water at a temperature in a cell are too long for one formula');
  const kelvin = Number(temperature.text);
  const readings = given.readings('pH');
  const activity = (pH: string): string =>
    isAcid ? `10^-${pH}` : `10^(${pH}-${numberText(waterIonProduct(kelvin))})`;
  const holds = [...species.holds, ...temperature.holds];
  if (!hasIons) return eachReading(readings, holds, activity);
  const ions = given.quantity('ionicstrength', 'mol/L');
  const root = `SQRT(${ions.text})`;
  const logarithm = `${numberText(debyeHueckelSlope(kelvin))}*(${root}/(1+${root})-0.3*${ions.text})`;
  return eachReading(readings, [...holds, ...ions.holds], (pH) => `${activity(pH)}*10^(${logarithm})`);
}
