import { InvalidInput, requireFinite, requireNotNegative, requirePositive, shown } from '../errors';

/** One absorbing species, or a reactant that turns one to one into a product that absorbs too. */
export interface Absorbers {
  /** ε of the species that is wanted, L mol⁻¹ cm⁻¹, 0 or more. */
  readonly absorptivity: number;
  /** Path through the sample, cm, above 0. */
  readonly path: number;
  /** Absorbance of the cell without it. */
  readonly blank: number;
  readonly product?: {
    /** ε of the product, L mol⁻¹ cm⁻¹. */
    readonly absorptivity: number;
    /** Reactant and product together, mol/L. */
    readonly total: number;
  };
}

/**
 * Concentration by the law of Beer and Lambert: c = (A − A₀)/(ε l); where the product absorbs as well,
 * c = [(A − A₀)/l − ε_P c_total]/(ε − ε_P).
 *
 * @param absorbance A, decadic
 * @returns c, mol/L; slightly negative where a reading scatters about the blank
 * @throws InvalidInput outside the ranges, or where both absorb alike
 * @see IUPAC Gold Book, Beer–Lambert law, doi:10.1351/goldbook.B00626
 * @example concentrationFromAbsorbance(0.487, { absorptivity: 2455, path: 0.5, blank: 0.012 }) // 0.000386965
 */
export function concentrationFromAbsorbance(absorbance: number, absorbers: Absorbers): number {
  const { absorptivity, path, blank, product } = absorbers;
  requireFinite({ absorbance, blank });
  requirePositive({ path });
  requireNotNegative({ absorptivity });
  const perPath = (absorbance - blank) / path;
  if (!product) {
    requirePositive({ absorptivity });
    return perPath / absorptivity;
  }
  requireNotNegative({ product: product.absorptivity });
  requirePositive({ total: product.total });
  const difference = absorptivity - product.absorptivity;
  if (difference === 0) {
    throw new InvalidInput(
      `absorptivity of reactant and product must differ: both are ${shown(absorptivity)} L/(mol cm)`,
    );
  }
  return (perPath - product.absorptivity * product.total) / difference;
}
