/** The equations for water (src/signal/water.ts, with their sources) in built-in functions. */
import { celsiusZero, standardAtmosphere } from '../../src/constants';
import { criticalDensity, criticalTemperature } from '../../src/signal/water';

/** Vapour pressure at saturation, Pa; IAPWS SR1-86(1992). @param kelvin a formula's text */
export const saturationPressureText = (kelvin: string): string =>
  `22064000*EXP(${criticalTemperature}/${kelvin}*SUMPRODUCT({-7.85951783,1.84408259,-11.7866497,22.6807411,-15.9618719,1.80122502},(1-${kelvin}/${criticalTemperature})^{1,1.5,3,3.5,4,7.5}))`;

/** Where that equation holds. */
export const vapourHolds = (kelvin: string): string[] => [
  `${kelvin}>=${celsiusZero}`,
  `${kelvin}<=${criticalTemperature}`,
];

/** Density of liquid water at 101.325 kPa, kg/m³. */
export const waterDensityText = (kelvin: string): string =>
  `${criticalDensity}*(1+SUMPRODUCT({1.99274064,1.09965342,-0.510839303,-1.75493479,-45.5170352,-674694.45},(1-${kelvin}/${criticalTemperature})^({1,2,5,16,43,110}/3)))*(1+4.6E-10*(${standardAtmosphere}-${saturationPressureText(kelvin)}))`;

export const liquidHolds = (kelvin: string): string[] => [
  `${kelvin}>=${celsiusZero}`,
  `${kelvin}<=${celsiusZero + 100}`,
];
