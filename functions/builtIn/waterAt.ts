/** Liquid water at a temperature that stands in a cell (src/signal, with the sources), on the sheet "Workings". */
import {
  avogadroConstant,
  boltzmannConstant,
  elementaryCharge,
  vacuumPermittivity,
} from '../../src/constants';
import { dielectricRelease, dielectricTerms } from '../../src/signal/dielectric';
import { criticalDensity, criticalTemperature } from '../../src/signal/water';
import type { Given } from './given';
import { numberText } from './text';
import { waterDensityText } from './water';
import type { Table, WorkingCell } from './workings';

/** Rows of the table. */
const [kelvin, density, z, ionProduct, g, a, b, permittivity, slope] = [0, 1, 2, 3, 4, 5, 6, 7, 8];

export interface WaterAt {
  /** pK of its ion product. */
  readonly ionProduct: string;
  /** Of the Debye–Hückel law, (L/mol)^½. */
  readonly debyeHueckelSlope: string;
}

/** @param name the parameter that holds the temperature */
export function waterAt(given: Given, name: string): WaterAt {
  const far = given.fromWorkings();
  const { text } = far.quantity(name, 'K');
  const title = `Liquid water at the temperature in ${far.argument(name)?.text}`;
  const table = given.workings.table(title, (own) => rows(own, text));
  return { ionProduct: table.cell(ionProduct, 0), debyeHueckelSlope: table.cell(slope, 0) };
}

function rows(own: Table, temperature: string): WorkingCell[][] {
  const at = (row: number): string => own.cell(row, 0);
  const t = at(kelvin);
  const list: WorkingCell[][] = [];
  list[kelvin] = [{ formula: temperature }, 'temperature, K'];
  list[density] = [{ formula: waterDensityText(t) }, 'density, kg/m³'];
  const d = `(${at(density)}/1000)`;
  list[z] = [
    { formula: `${d}*EXP(-0.702132+8681.05/${t}-24145.1*${d}^(2/3)/${t}^2)` },
    'z of the ion product, IAPWS R11-24',
  ];
  const gas = `0.61415+48251.33/${t}-67707.93/${t}^2+10102100/${t}^3`;
  const solvation = `LOG10(1+${at(z)})-${at(z)}/(1+${at(z)})*${d}*(0.813876-51.4471/${t}-0.46992*${d})`;
  list[ionProduct] = [{ formula: `-12*(${solvation})+${gas}+2*LOG10(0.018015268)` }, 'pK of the ion product'];
  const terms = (n: 0 | 1 | 2): string =>
    `{${dielectricTerms.map((term) => numberText(term[n]).replace(/[()]/g, '')).join(',')}}`;
  const powers = `(${at(density)}/${criticalDensity})^${terms(1)}*(${criticalTemperature}/${t})^${terms(2)}`;
  list[g] = [
    {
      formula: `1+0.00196096504426*${at(density)}/${criticalDensity}*(${t}/228-1)^-1.2+SUMPRODUCT(${terms(0)},${powers})`,
    },
    'g of the dielectric constant, IAPWS R8-97',
  ];
  const { avogadro, boltzmann, molarMass, dipoleMoment, polarizability } = dielectricRelease;
  const epsilon = dielectricRelease.vacuumPermittivity;
  const perDensity = avogadro / molarMass;
  list[a] = [
    {
      formula: `${numberText((perDensity * dipoleMoment ** 2) / (epsilon * boltzmann))}*${at(density)}*${at(g)}/${t}`,
    },
    'A of the dielectric constant',
  ];
  list[b] = [
    { formula: `${numberText((perDensity * polarizability) / (3 * epsilon))}*${at(density)}` },
    'B of the dielectric constant',
  ];
  const root = `SQRT(9+2*${at(a)}+18*${at(b)}+${at(a)}^2+10*${at(a)}*${at(b)}+9*${at(b)}^2)`;
  list[permittivity] = [{ formula: `(1+${at(a)}+5*${at(b)}+${root})/(4-4*${at(b)})` }, 'dielectric constant'];
  const length = elementaryCharge ** 2 / (4 * Math.PI * vacuumPermittivity * boltzmannConstant);
  const perRoot = (Math.sqrt(2 * Math.PI * avogadroConstant) * length ** 1.5) / Math.LN10;
  list[slope] = [
    { formula: `${numberText(perRoot)}*SQRT(${at(density)})/(${at(permittivity)}*${t})^1.5` },
    'slope of the Debye–Hückel law, (L/mol)^½',
  ];
  return list;
}
