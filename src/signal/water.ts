/** Water as it meets a gas run: vapour in the gas, liquid under the tube. */
import { InvalidInput, requireFinite, shown } from '../errors';
import { celsiusZero, standardAtmosphere } from '../constants';

/** K */
export const criticalTemperature = 647.096;
/** kg/m³ */
export const criticalDensity = 322;
const criticalPressure = 22.064e6; // Pa

/**
 * Vapour pressure of water at saturation, by the IAPWS equation for the saturation line.
 *
 * ln(p/p꜀) = (T꜀/T)(a₁τ + a₂τ^1.5 + a₃τ³ + a₄τ^3.5 + a₅τ⁴ + a₆τ^7.5), τ = 1 − T/T꜀
 *
 * @param temperature K, from 273.15 to 647.096
 * @returns p, Pa
 * @throws InvalidInput outside that range
 * @see IAPWS SR1-86(1992); W. Wagner and A. Pruß, J. Phys. Chem. Ref. Data 22 (1993) 783, doi:10.1063/1.555926
 * @example saturationPressure(298.15) // 3169.82
 */
export function saturationPressure(temperature: number): number {
  requireFinite({ temperature });
  if (temperature < celsiusZero || temperature > criticalTemperature) {
    throw new InvalidInput(
      `temperature must be from 0 to 373.946 degC for water vapour: got ${shown(temperature - celsiusZero)} degC`,
    );
  }
  const tau = 1 - temperature / criticalTemperature;
  const sum =
    -7.85951783 * tau +
    1.84408259 * tau ** 1.5 -
    11.7866497 * tau ** 3 +
    22.6807411 * tau ** 3.5 -
    15.9618719 * tau ** 4 +
    1.80122502 * tau ** 7.5;
  return criticalPressure * Math.exp((criticalTemperature / temperature) * sum);
}

/**
 * Density of air-free liquid water at 101.325 kPa: that on the saturation line, by the IAPWS equation,
 * compressed from the vapour pressure with 4.6 × 10⁻¹⁰ Pa⁻¹, which holds within a tenth up to 100 °C.
 *
 * Within 1 part in 10⁵ of IAPWS-95.
 *
 * ρ/ρ꜀ = 1 + b₁τ^(1/3) + b₂τ^(2/3) + b₃τ^(5/3) + b₄τ^(16/3) + b₅τ^(43/3) + b₆τ^(110/3)
 *
 * @param temperature K, from 273.15 to 373.15
 * @returns ρ, kg/m³
 * @throws InvalidInput outside that range
 * @see IAPWS SR1-86(1992); W. Wagner and A. Pruß, J. Phys. Chem. Ref. Data 22 (1993) 783, doi:10.1063/1.555926
 * @example waterDensity(298.15) // 997.044
 */
export function waterDensity(temperature: number): number {
  requireFinite({ temperature });
  if (temperature < celsiusZero || temperature > celsiusZero + 100) {
    throw new InvalidInput(
      `temperature must be from 0 to 100 degC for liquid water: got ${shown(temperature - celsiusZero)} degC`,
    );
  }
  const third = Math.cbrt(1 - temperature / criticalTemperature);
  const saturated =
    1 +
    1.99274064 * third +
    1.09965342 * third ** 2 -
    0.510839303 * third ** 5 -
    1.75493479 * third ** 16 -
    45.5170352 * third ** 43 -
    6.7469445e5 * third ** 110;
  const compression = 4.6e-10 * (standardAtmosphere - saturationPressure(temperature));
  return criticalDensity * saturated * (1 + compression);
}
