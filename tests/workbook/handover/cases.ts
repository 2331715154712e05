/** Sheets to hand over: what is typed in each, and what is typed over it afterwards. Invented readings throughout. */
import { column, type Typed } from '../engine/book';

export interface Case {
  readonly typed: Typed;
  /** Whether its formulas can be said in built-in functions. */
  readonly becomes: 'live' | 'frozen';
  /** Inputs that someone changes in the copy. */
  readonly changed: Typed;
  /** Left out where the inputs of a frozen formula can be watched. */
  readonly unwatched?: true;
  /** What PACE makes of that: an error, or numbers as before. */
  readonly then?: 'error';
}

const run = {
  ...column('A2', [0, 20, 40, 60, 90, 120, 180, 240]),
  ...column('B2', [0, 16, 28, 36.4, 44.8, 50, 55.2, 57.4]),
};

/** Invented: four temperatures, one of them twice, with standard uncertainties. */
const oven = {
  ...column('A1', [25, 25, 40, 50, 60]),
  ...column('B1', [3.2e-6, 3.4e-6, 2.1e-5, 7.4e-5, 2.2e-4]),
  ...column('C1', [1e-7, 1e-7, 9e-7, 3e-6, 1.2e-5]),
};

export const cases: Readonly<Record<string, Case>> = {
  'Conversion, gaps and text': {
    typed: {
      ...column('A1', [32, null, 16, 'n/a', '=1/0', 0.5]),
      B1: 32,
      B2: -8,
      C1: '=PACE.CONVERSION(A1:A6,B1,B2)',
    },
    becomes: 'live',
    changed: { A1: 31, A2: 20, B2: -7.5 },
  },
  'Conversion of a truth value': {
    typed: { ...column('A1', [32, true]), C1: '=PACE.CONVERSION(A1:A2,32,0)' },
    becomes: 'frozen',
    unwatched: true,
    changed: {},
  },
  'Numbers written as text': {
    typed: { ...column('A1', [32, '16,5']), C1: '=PACE.CONVERSION(A1:A2,32,0)' },
    becomes: 'frozen',
    changed: { A1: 33 },
  },
  'Conversion, end equals start': {
    typed: { ...column('A1', [32, 16]), B1: 32, B2: -8, C1: '=PACE.CONVERSION(A1:A2,B1,B2)' },
    becomes: 'live',
    changed: { B2: 32 },
    then: 'error',
  },
  'A block, beside it another': {
    typed: {
      A1: 1,
      B1: 2,
      A2: 3,
      B2: 4,
      D1: '=PACE.CONVERSION(A1:B2,0,8)',
      A5: '=PACE.CONVERSION(D1:E2,1,0)',
    },
    becomes: 'live',
    changed: { B1: 5 },
  },
  Remaining: {
    typed: { ...column('A1', [0, 0.004, 0.008]), B1: 0.02, B2: 2, C1: '=PACE.REMAINING(A1:A3,B1,B2)' },
    becomes: 'live',
    changed: { A3: 0.009, B1: 0.03 },
  },
  'Remaining, too much formed': {
    typed: { ...column('A1', [0, 0.004]), B1: 0.02, C1: '=PACE.REMAINING(A1:A2,B1)' },
    becomes: 'live',
    changed: { A2: 0.022 },
    then: 'error',
  },
  Titre: {
    typed: { ...column('A1', [12.4, 8.2]), B1: '0.02 mol/L', B2: 10, C1: '=PACE.TITRE(A1:A2,B1,B2,2.5)' },
    becomes: 'live',
    changed: { A1: 12.6, B1: '0.0205 mol/L' },
  },
  'Titre, negative volume': {
    typed: { ...column('A1', [12.4, 8.2]), C1: '=PACE.TITRE(A1:A2,"20 mmol/L","5 mL")' },
    becomes: 'live',
    changed: { A2: -0.1 },
    then: 'error',
  },
  'Total pressure': {
    typed: { ...column('A1', [46.4, 55.1]), B1: 46.4, B2: 1.5, C1: '=PACE.TOTALPRESSURE(A1:A2,B1,B2)' },
    becomes: 'live',
    changed: { A2: 60, B2: 1.4 },
  },
  'Total pressure, gas lost': {
    typed: { ...column('A1', [46.4, 40]), B1: -0.5, C1: '=PACE.TOTALPRESSURE(A1:A2,46.4,B1)' },
    becomes: 'live',
    changed: { A2: 20 },
    then: 'error',
  },
  'Absorbance, path and blank': {
    typed: { ...column('A1', [0.512, 0.3]), B1: 2455, B2: '5 mm', C1: '=PACE.ABSORBANCE(A1:A2,B1,B2,0.012)' },
    becomes: 'live',
    changed: { A1: 0.6, B2: '10 mm' },
  },
  'Absorbance of two': {
    typed: {
      ...column('A1', [0.512, 0.3]),
      B1: 2455,
      B2: 310,
      C1: '=PACE.ABSORBANCE(A1:A2,B1,1,0,B2,"0.4 mmol/L")',
    },
    becomes: 'live',
    changed: { B2: 400 },
  },
  Conductivity: {
    typed: {
      ...column('A1', [2.5, 1.7, 0.9]),
      ...column('B1', [24.6, 25.1, 25.8]),
      C1: '=PACE.CONDUCTIVITY(A1:A3,2.5,0.9,0.01,B1:B3,1.9)',
      D1: '=PACE.CONDUCTIVITY(A1:A3,2.5,0.9,0.01)',
    },
    becomes: 'live',
    changed: { A2: 1.6, B3: 27 },
  },
  'Timed events': {
    typed: {
      ...column('A1', [40, 25, null]),
      B1: -0.002,
      C1: '=PACE.EVENT(A1:A3)',
      D1: '=PACE.EVENT(A1:A3,B1)',
      E1: '=PACE.EVENT(A1,B1,-2)*1000',
    },
    becomes: 'live',
    changed: { A3: 31, B1: -0.0025 },
  },
  'Gas over water': {
    typed: {
      ...run,
      D1: '21.4 degC',
      D2: '100.6 kPa',
      D3: true,
      D4: '35 mm',
      E2: '=PACE.GASVOLUME(B2:B9,D1,D2,D3,"mL",D4)',
    },
    becomes: 'live',
    changed: { B9: 58, D1: '23 degC', D3: false },
  },
  'Gas, a temperature each': {
    typed: {
      ...column('A1', [10, 20]),
      ...column('B1', [21, 22.5]),
      C1: 99.5,
      D1: '=PACE.GASVOLUME(A1:A2,B1:B2,C1,0.9)',
    },
    becomes: 'live',
    changed: { B2: 24, C1: 101.2 },
  },
  'Gas, below freezing and wet': {
    typed: { A1: 10, B1: 20, D1: '=PACE.GASVOLUME(A1,B1,100,TRUE)' },
    becomes: 'live',
    changed: { B1: -3 },
    then: 'error',
  },
  'Gas pressure': {
    typed: {
      ...column('A1', [null, 101.3, 104.6]),
      ...column('B1', [25, 25, 25.4]),
      C1: '=PACE.GASPRESSURE(A1:A3,"135 mL",B1:B3)',
      D1: '=PACE.GASPRESSURE(A1:A3,135,25,760,"mmHg")',
    },
    becomes: 'live',
    changed: { A2: 100.9, B3: 26 },
  },
  Dissolved: {
    typed: { ...column('A1', [97, 80]), B1: 25, C1: '=PACE.DISSOLVED(A1:A2,"CO2",100,B1)' },
    becomes: 'live',
    changed: { A2: 60, B1: 18 },
  },
  'Mass loss': {
    typed: {
      ...column('A1', [187.352, 187.1, null, 186.9]),
      B1: 0.001,
      B2: '21 degC',
      C1: '=PACE.MASSLOSS(A1:A4,"CO2",,B1,B2)',
      D1: '=PACE.MASSLOSS(A1:A4,44.01,187.4,B1,,,TRUE)',
    },
    becomes: 'live',
    changed: { A1: 187.36, A4: 186.8, B2: '19.5 degC' },
  },
  'Mass loss that cannot be seen': {
    typed: { ...column('A1', [100, 99]), B1: 0.01, C1: '=PACE.MASSLOSS(A1:A2,"H2",,B1)' },
    becomes: 'live',
    changed: { B1: 2 },
    then: 'error',
  },
  'Within other formulas': {
    typed: {
      ...column('A1', [0, 0.004, 0.008]),
      C1: '=SUM(PACE.REMAINING(A1:A3,0.02))*2',
      D1: '=PACE.CONVERSION(PACE.REMAINING(A1:A3,0.02),0.02,0)',
      E1: '=100*PACE.REMAINING(A1:A3,0.02)',
    },
    becomes: 'live',
    changed: { A3: 0.009 },
  },
  'It’s another sheet': {
    typed: {
      C1: "=PACE.CONVERSION('Conversion, gaps and text'!A1:A6,'Conversion, gaps and text'!B1,-8)",
    },
    becomes: 'live',
    changed: {},
  },
  'A fit': {
    typed: { ...run, D2: '=PACE.COEFFICIENT(A2:A9,B2:B9,1,"free",,TRUE)' },
    becomes: 'frozen',
    changed: { B5: 36.5 },
  },
  'A fit that is given text': {
    typed: { ...run, D1: 'free', D2: '=PACE.HALFLIFE(A2:A9,B2:B9,1,D1)' },
    becomes: 'frozen',
    changed: { D1: 'fres' },
  },
  'Average rate': {
    typed: {
      ...run,
      D1: 30,
      D2: '=PACE.BETWEEN(A2:A9,B2:B9,0,D1)',
      D3: '=PACE.BETWEEN(A2:A9,B2:B9,90,180,-2)',
    },
    becomes: 'live',
    changed: { B3: 15, B4: null, D1: 50 },
  },
  'Average rate, unsorted with replicates': {
    typed: {
      ...column('A1', [20, 0, 10, 10, 30]),
      ...column('B1', [5, 9, 7.1, 6.9, 4]),
      D1: 25,
      D2: '=PACE.BETWEEN(A1:A5,B1:B5,0,D1)',
    },
    becomes: 'live',
    changed: { A5: 26, B4: 'lost' },
  },
  'Average rate, beyond the run': {
    typed: { ...run, D1: 30, D2: '=PACE.BETWEEN(A2:A9,B2:B9,0,D1)' },
    becomes: 'live',
    changed: { D1: 241 },
    then: 'error',
  },
  'Average rate, an error among the readings': {
    typed: { ...run, D2: '=PACE.BETWEEN(A2:A9,B2:B9,0,60)' },
    becomes: 'live',
    changed: { B9: '=1/0' },
    then: 'error',
  },
  Tangent: {
    typed: {
      ...run,
      D1: 60,
      D2: '=PACE.TANGENT(A2:A9,B2:B9,D1,5)',
      D3: '=PACE.TANGENT(A2:A9,B2:B9,D1,5,2,-1,TRUE)',
      D4: '=PACE.TANGENT(A2:A9,B2:B9,240,3,2,,TRUE)',
      D5: '=PACE.TANGENT(A2:A9,B2:B9,0,4,1)',
    },
    becomes: 'live',
    changed: { B4: 27, B6: null, D1: 70 },
  },
  'Tangent, window chosen from the data': {
    typed: { ...run, D2: '=PACE.TANGENT(A2:A9,B2:B9,60)' },
    becomes: 'frozen',
    changed: { A9: 250 },
  },
  'Rates along a run': {
    typed: { ...run, D2: '=PACE.ALONG(A2:A9,B2:B9,5)', F2: '=PACE.ALONG(A2:A9,B2:B9,5,2,,TRUE)' },
    becomes: 'live',
    changed: { B4: 27, A9: 230 },
  },
  'Rates along a row': {
    typed: {
      ...Object.fromEntries(
        ['A', 'B', 'C', 'D', 'E'].flatMap((name, n) => [
          [`${name}1`, 10 * n],
          [`${name}2`, [9, 7, 5.5, 4.6, 4.1][n]],
        ]),
      ),
      A4: '=PACE.ALONG(A1:E1,A2:E2,3,1)',
    },
    becomes: 'live',
    changed: { C2: 5.7 },
  },
  Arrhenius: {
    typed: {
      ...oven,
      D1: '=PACE.ARRHENIUS(A1:A5,B1:B5)',
      D2: '=PACE.ARRHENIUS(A1:A5,B1:B5,C1:C5,TRUE)',
      D5: '=PACE.ARRHENIUS(A1:A2,B1:B2,,TRUE)',
    },
    becomes: 'live',
    changed: { A3: 41, B5: null },
  },
  'Arrhenius, a coefficient below 0': {
    typed: { ...oven, D1: '=PACE.ARRHENIUS(A1:A5,B1:B5)' },
    becomes: 'live',
    changed: { B2: -1 },
    then: 'error',
  },
  Eyring: {
    typed: {
      ...oven,
      D1: '=PACE.EYRING(A1:A5,B1:B5)',
      D2: '=PACE.EYRING(A1:A5,B1:B5,"relative",TRUE)',
    },
    becomes: 'live',
    changed: { A3: 41, B1: 3.3e-6 },
  },
  'k at another temperature': {
    typed: {
      ...oven,
      G1: 5,
      D1: '=PACE.COEFFICIENTAT(A1:A5,B1:B5,G1)',
      D2: '=PACE.COEFFICIENTAT(A1:A5,B1:B5,G1,C1:C5,TRUE)',
      D3: '=PACE.COEFFICIENTAT(A1:A5,B1:B5,"308.15 K",,TRUE)',
    },
    becomes: 'live',
    changed: { B4: 9e-5, G1: 33 },
  },
  'Mean kinetic temperature': {
    typed: {
      ...column('A1', [20, 24.5, 31, null, 22]),
      ...column('B1', [0, 2, 5, 6, 12]),
      ...column('C1', [20, 24.5, 31, 28, 22]),
      D1: '=PACE.MEANTEMP(A1:A5)',
      D2: '=PACE.MEANTEMP(C1:C5,B1:B5,"70 kJ/mol")',
    },
    becomes: 'live',
    changed: { A2: 40, B4: 9, C3: 35 },
  },
  'Time to a conversion': {
    typed: {
      A1: 0.5,
      A2: 3.21e-5,
      A3: 2,
      A4: 0.8,
      D1: '=PACE.TIMETO(A1,A2,1)',
      D2: '=PACE.TIMETO(A1,A2,A3,A4)',
      D3: '=PACE.TIMETO(A1,A2,1.0000001,A4)',
      D4: '=PACE.TIMETO(A1,A2,0.5,A4)/3600',
    },
    becomes: 'live',
    changed: { A1: 0.9, A3: 1 },
  },
  'Time to a conversion above 1': {
    typed: { A1: 0.5, D1: '=PACE.TIMETO(A1,0.1,1)' },
    becomes: 'live',
    changed: { A1: 1 },
    then: 'error',
  },
  Acidity: {
    typed: {
      ...column('A1', [3, 2.5, null, 11]),
      B1: '0.1 mol/L',
      C1: '=PACE.ACIDITY(A1:A4)',
      D1: '=PACE.ACIDITY(A1:A4,B1,25,"OH")',
      E1: '=PACE.ACIDITY(A1:A4,,"30 degC","OH")',
    },
    becomes: 'live',
    changed: { A3: 4.2, B1: '0.2 mol/L' },
  },
  'Acidity, out of bounds': {
    typed: { ...column('A1', [3, 2.5]), C1: '=PACE.ACIDITY(A1:A2)' },
    becomes: 'live',
    changed: { A2: 17 },
    then: 'error',
  },
  Unit: {
    typed: { A1: 2, A2: 'mmol/L', C1: '=PACE.UNIT(A1,A2,"min")', C2: '=PACE.UNIT(1.5)' },
    becomes: 'live',
    changed: { A1: 1 },
  },
  Standards: {
    typed: {
      ...column('A1', [0, 2, 4, null, 8]),
      ...column('B1', [0.11, 0.49, 0.92, 1.3, 1.69]),
      ...column('C1', [0.3, 0.7, 'n/a', 1.75]),
      E1: '=PACE.STANDARDS(A1:A5,B1:B5,C1:C4)',
      F1: '=PACE.STANDARDS(A1:A5,B1:B5,C1:C4,,,3,TRUE)',
      K1: '=PACE.STANDARDS(A1:A5,B1:B5,C1:C4,,TRUE,,TRUE)',
    },
    becomes: 'live',
    changed: { A4: 6, B2: 0.5, C2: 0.8 },
  },
  'Standards, a reading beyond them': {
    typed: {
      ...column('A1', [0, 2, 4]),
      ...column('B1', [0.1, 0.5, 0.9]),
      C1: 0.7,
      E1: '=PACE.STANDARDS(A1:A3,B1:B3,C1)',
    },
    becomes: 'live',
    changed: { C1: 1.2 },
    then: 'error',
  },
  'Initial rate': {
    typed: {
      ...run,
      D2: '=PACE.START(A2:A9,B2:B9)',
      D3: '=PACE.START(A2:A9,B2:B9,0.9,,TRUE)',
      D4: '=PACE.START(A2:A9,B2:B9,1,2)',
    },
    becomes: 'live',
    changed: { B3: 15, A9: 250 },
  },
  'Normalised time': {
    typed: {
      ...run,
      E1: 1.5,
      D2: '=PACE.NORMALTIME(A2:A9,B2:B9,E1)',
      F2: '=PACE.NORMALTIME(A2:A9,B2:B9,0)',
    },
    becomes: 'live',
    changed: { B5: 36, E1: 0.5 },
  },
  'Normalised time that cannot be': {
    typed: { ...run, B2: 1, E1: 1.5, D2: '=PACE.NORMALTIME(A2:A9,B2:B9,E1)' },
    becomes: 'live',
    changed: { B3: -1 },
    then: 'error',
  },
  'Half lives read off': {
    typed: {
      ...column('A1', [0, 10, 20, 32, 45]),
      ...column('B1', [8, 4.1, 2.2, 1.1, 0.4]),
      D1: '=PACE.HALVINGS(A1:A5,B1:B5)',
      E1: '=PACE.HALVINGS(A1:A5,B1:B5,0.3)',
    },
    becomes: 'live',
    changed: { B2: 4.3, A5: 44 },
  },
  'Clock times': {
    typed: {
      ...column('A1', [0.9985, 0.9999, 0.0012, 0.004]),
      C1: '=PACE.CLOCK(A1:A4,"min","first")',
      D1: '=PACE.CLOCK(A1:A4)',
    },
    becomes: 'live',
    changed: { A3: 0.0015, A4: 0.0051 },
  },
  Exponents: {
    typed: {
      ...column('A1', [0.003, 0.0047, 0.0067, null, 0.011]),
      ...column('B1', [0.1, 0.1, 0.15, 0.2, 0.2]),
      ...column('C1', [0.1, 0.15, 0.1, 0.1, 0.08]),
      E1: '=PACE.EXPONENTS(A1:A5,B1:C5)',
      E3: '=PACE.EXPONENTS(A1:A5,B1:C5,TRUE)',
      E8: '=PACE.EXPONENTS(A1:A5,B1:B5,TRUE)',
    },
    becomes: 'live',
    changed: { A2: 0.0049, A4: 0.012 },
  },
  'Exponents, reactants always changed together': {
    typed: {
      ...column('A1', [0.003, 0.0047, 0.0067, 0.011]),
      ...column('B1', [0.1, 0.1, 0.2, 0.2]),
      ...column('C1', [0.1, 0.15, 0.2, 0.3]),
      E1: '=PACE.EXPONENTS(A1:A4,B1:C4)',
    },
    becomes: 'live',
    changed: { C1: 0.2, C2: 0.2, C3: 0.4, C4: 0.4 },
    then: 'error',
  },
};
