/** An ion's concentration from a pH, said in built-in functions. */
import { waterIonProduct } from '../../src/signal/acidity';
import { debyeHueckelSlope } from '../../src/signal/activity';
import { eachReading } from './eachReading';
import type { Given } from './given';
import type { Said } from './said';
import { numberText } from './text';
import { liquidHolds } from './water';
import { waterAt, type WaterAt } from './waterAt';

export function sayAcidity(given: Given): Said {
  const species = given.word('species');
  const isAcid = /^H[+⁺]?$/i.test(species.value);
  const hasIons = given.has('ionicstrength');
  const temperature = given.quantity('temperature', 'K');
  const isKnown = temperature.holds.length === 0;
  const water = (): WaterAt =>
    isKnown ? waterToday(Number(temperature.text)) : waterAt(given, 'temperature');
  const readings = given.readings('pH');
  const activity = (pH: string): string => (isAcid ? `10^-${pH}` : `10^(${pH}-${water().ionProduct})`);
  const needsWater = !isKnown && (hasIons || !isAcid);
  const liquid = needsWater ? liquidHolds(temperature.text) : [];
  const holds = [...species.holds, ...temperature.holds, ...liquid];
  if (!hasIons) return eachReading(readings, holds, activity);
  const ions = given.quantity('ionicstrength', 'mol/L');
  const root = `SQRT(${ions.text})`;
  const logarithm = `${water().debyeHueckelSlope}*(${root}/(1+${root})-0.3*${ions.text})`;
  return eachReading(readings, [...holds, ...ions.holds], (pH) => `${activity(pH)}*10^(${logarithm})`);
}

const waterToday = (kelvin: number): WaterAt => ({
  ionProduct: numberText(waterIonProduct(kelvin)),
  debyeHueckelSlope: numberText(debyeHueckelSlope(kelvin)),
});
