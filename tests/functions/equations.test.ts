/** What is typeset says what is worked out, every sign in it is explained, and both forms can be read by others. */
import { SaxesParser } from 'saxes';
import { catalogue, functionNamed } from '../../functions/catalogue';
import { typedName } from '../../functions/define';
import { partsIn, quantitiesIn } from '../../functions/equation/equation';
import { asLatex } from '../../functions/equation/latex';
import { asMathML } from '../../functions/equation/mathml';
import { readEquation } from '../../functions/equation/read';
import { gasConstant, boltzmannConstant, planckConstant, standardGravity } from '../../src/constants';
import { waterDensity } from '../../src/signal/water';
import { valueOf } from '../support/equationValue';
import { calculate } from '../support/literal';

const all = catalogue.flatMap((f) => (f.equations?.lines ?? []).map((line) => ({ f, line })));

test.each(catalogue.filter(({ equations }) => equations).map((f) => [typedName(f), f] as const))(
  '%s explains every sign of its equations, and no other',
  (_, { equations }) => {
    const { lines, where } = equations!;
    const used = new Set(lines.flatMap((line) => indicesAside(line)));
    expect(Object.keys(where).sort()).toEqual([...used].sort());
  },
);

/** An index that a sum runs over is no quantity of its own. */
const indicesAside = (line: string): string[] =>
  quantitiesIn(readEquation(line)).filter((name) => !['i', 'j'].includes(name));

test('every equation becomes well-formed MathML, with its fractions as fractions', () => {
  for (const { line } of all) {
    const parser = new SaxesParser({ fragment: false });
    parser.on('error', (error) => {
      throw error;
    });
    const text = asMathML(line).replaceAll('&#x2061;', '');
    parser.write(text).close();
    const fractions = partsIn(readEquation(line)).filter(({ kind }) => kind === 'fraction').length;
    expect(text.match(/<mfrac>/g)?.length ?? 0).toBeGreaterThanOrEqual(fractions);
  }
});

test('readEquation: a stroke divides what touches it, and brackets that only hold a fraction together go', () => {
  expect(asLatex('n = (p − q)V/(RT)')).toBe('n=\\frac{\\left(p-q\\right)V}{RT}');
  expect(asLatex('t½ = (ln 2)/κ')).toBe('t_{1/2}=\\frac{\\ln 2}{\\kappa }');
  expect(asLatex('ΔG‡ = ΔH‡ − TΔS‡')).toBe(
    '\\Delta G^{\\ddagger}=\\Delta H^{\\ddagger}-T\\Delta S^{\\ddagger}',
  );
  expect(() => readEquation('a/b/c')).toThrow(/cannot be read/);
  expect(() => readEquation('(a')).toThrow(/cannot be read/);
});

/** A call, the line of its equations that holds for it, and what the quantities in that are. */
const cases: readonly (readonly [string, number, Readonly<Record<string, number>>])[] = [
  [
    '=PACE.GASVOLUME(48.6,22,99.45,0,"mL",30)',
    0,
    {
      p: 99450,
      ρ: waterDensity(295.15),
      g: standardGravity,
      h: 0.03,
      φ: 0,
      'p*': 2645,
      V: 48.6e-6,
      R: gasConstant,
      T: 295.15,
    },
  ],
  [
    '=PACE.GASPRESSURE(104.575,135,25,101.325)',
    0,
    { V: 135e-6, R: gasConstant, p: 104575, T: 298.15, 'p₀': 101325, 'T₀': 298.15 },
  ],
  ['=PACE.TOTALPRESSURE(55.1,46.4,1.5)', 0, { 'p₀': 46.4, p: 55.1, Δν: 1.5 }],
  ['=PACE.MASSLOSS(186.9,44.009,187.4)', 0, { 'm₀': 187.4, m: 186.9, M: 44.009 }],
  ['=PACE.ACIDITY(3.3)', 0, { pH: 3.3, γ: 1 }],
  ['=PACE.ABSORBANCE(0.512,2500,2,0.012)', 0, { A: 0.512, 'A₀': 0.012, ε: 2500, l: 2 }],
  [
    '=PACE.ABSORBANCE(0.5,2500,2,0.02,900,0.0002)',
    1,
    { A: 0.5, 'A₀': 0.02, ε: 2500, l: 2, ε_p: 900, c_tot: 0.0002 },
  ],
  ['=PACE.CONDUCTIVITY(1.7,2.5,0.9,0.01)', 0, { 'c₀': 0.01, κ: 1.7, 'κ₀': 2.5, 'κ∞': 0.9 }],
  // a start of 1 and an end of 0 leave the reading at 25 °C itself
  ['=PACE.CONDUCTIVITY(1.7,1,0,1,31,2)', 1, { κ_t: 1.7, α: 0.02, t: 31 }],
  ['=PACE.TITRE(12.4,0.02,10,2.5)', 0, { z: 2.5, c_t: 0.02, V: 12.4, V_a: 10 }],
  ['=PACE.STANDARDS({0;2;4},{0.1;0.5;0.9},0.3)', 1, { y: 0.3, a: 0.1, b: 0.2 }],
  ['=PACE.CONVERSION(16,32,-8)', 0, { 'r₀': 32, r: 16, 'r∞': -8 }],
  ['=PACE.REMAINING(0.004,0.02,2)', 0, { 'c₀': 0.02, z: 2, c_f: 0.004 }],
  ['=PACE.BETWEEN({0;10;20},{1;0.6;0.4},0,20,-2)', 0, { ν: -2, 'y₂': 0.4, 'y₁': 1, 't₂': 20, 't₁': 0 }],
  ['=PACE.EVENT(40,-0.01,-2)', 0, { Δc: -0.01, ν: -2, t: 40 }],
  // the law of order 2 by hand: 1/c = 1/8 + 0.05 t
  [
    '=PACE.CURVE({0;10;20;30},{8;1.6;0.888888888888889;0.615384615384615},2,7)',
    0,
    { 'y∞': 0, 'y₀': 8, n: 2, κ: 0.4, t: 7 },
  ],
  ['=PACE.CURVE({0;10;20;30},{8;4;2;1},1,7)', 1, { 'y∞': 0, 'y₀': 8, κ: Math.LN2 / 10, t: 7 }],
  [
    '=PACE.COEFFICIENT({0;10;20;30},{8;1.6;0.888888888888889;0.615384615384615},2)',
    2,
    { κ: 0.4, 'y₀': 8, 'y∞': 0, n: 2 },
  ],
  ['=PACE.HALFLIFE({0;10;20;30},{8;1.6;0.888888888888889;0.615384615384615},2)', 2, { n: 2, κ: 0.4 }],
  ['=PACE.HALFLIFE({0;10;20;30},{8;4;2;1},1)', 3, { κ: Math.LN2 / 10 }],
  ['=PACE.HALVINGS({0;10;20},{8;6;3})', 0, { 't₁': 10, 't₂': 20, 'a₁': 6, 'a₂': 3, a: 4 }],
  ['=PACE.TIMETO(0.3,0.02,1.5,0.4)', 0, { x: 0.3, n: 1.5, k: 0.02, 'c₀': 0.4 }],
  ['=PACE.TIMETO(0.3,0.02,1)', 1, { x: 0.3, k: 0.02 }],
];

test.each(cases)('%s answers what line %d of its equations says', (formula, line, known) => {
  const f = functionNamed(/PACE\.([A-Z]+)/.exec(formula)![1])!;
  const answer = calculate(formula);
  const value = Array.isArray(answer) ? (answer[0][0] as number) : (answer as number);
  expect(valueOf(f.equations!.lines[line], known) / value - 1).toBeCloseTo(0, 8);
});

test('ACIDITY: the activity coefficient is that of its equation', () => {
  const [plain, salty] = ['=PACE.ACIDITY(3)', '=PACE.ACIDITY(3,0.1)'].map(
    (call) => calculate(call) as number,
  );
  // A at 25 °C by IAPWS R8-97 and the density of water, 0.5098
  const logarithm = valueOf(functionNamed('ACIDITY')!.equations!.lines[2], { A: 0.5098, I: 0.1 });
  expect(Math.log10(plain / salty)).toBeCloseTo(logarithm, 4);
});

test('ARRHENIUS and EYRING: their answers put into their equations give the coefficients back', () => {
  const [energy, factor] = [0, 1].map(
    (row) => (calculate('=PACE.ARRHENIUS({25;35},{1;2},,TRUE)') as number[][])[row][0],
  );
  const line = functionNamed('ARRHENIUS')!.equations!.lines[0];
  const known = { A: Math.exp(factor), E_a: energy * 1000, R: gasConstant };
  expect(valueOf(line, { ...known, T: 298.15 })).toBeCloseTo(1, 10);
  expect(valueOf(line, { ...known, T: 308.15 })).toBeCloseTo(2, 10);
  const [[enthalpy, entropy, gibbs]] = calculate('=PACE.EYRING({25;35},{1;2})') as number[][];
  const [law, free] = functionNamed('EYRING')!.equations!.lines;
  const activation = { 'ΔH‡': enthalpy * 1000, 'ΔS‡': entropy, T: 308.15 };
  const constants = { k_B: boltzmannConstant, h: planckConstant, R: gasConstant };
  expect(valueOf(law, { ...activation, ...constants })).toBeCloseTo(2, 10);
  expect(valueOf(free, { ...activation, T: 298.15 }) / 1000).toBeCloseTo(gibbs, 9);
});
