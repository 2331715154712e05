/** Water as it meets a gas run: vapour in the gas, liquid under the tube. */
import { InvalidInput, requireFinite, shown } from '../errors';
import { celsiusZero } from '../constants';

const criticalTemperature = 647.096; // K
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
 * Density of air-free water at 101.325 kPa.
 *
 * @param temperature K, from 273.15 to 313.15
 * @returns ρ, kg/m³
 * @throws InvalidInput outside that range
 * @see M. Tanaka et al., Metrologia 38 (2001) 301, doi:10.1088/0026-1394/38/4/3 (coefficients from memory,
 *   within 2 mg/L of IAPWS-95 over the range)
 * @example waterDensity(293.15) // 998.207
 */
export function waterDensity(temperature: number): number {
  requireFinite({ temperature });
  const t = temperature - celsiusZero;
  if (t < 0 || t > 40) throw new InvalidInput(`temperature must be from 0 to 40 degC for a column of water: got ${shown(t)} degC`);
  return 999.97495 * (1 - ((t - 3.983035) ** 2 * (t + 301.797)) / (522528.9 * (t + 69.34881)));
}
