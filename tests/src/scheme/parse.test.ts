/** Written mechanisms: what is understood, and where an error points. */
import { parseScheme } from '../../../src/scheme/parse';
import { reactionInWords } from '../../../src/scheme/scheme';

const read = (text: string): { species: string; steps: string[] } => {
  const { species, reactions } = parseScheme(text);
  return { species: species.join(' '), steps: reactions.map(({ words }) => words) };
};

test.each([
  ['A + B -> C; C <-> D', 'A B C D', ['A + B -> C', 'C -> D', 'D -> C']],
  ['A -> B -> C', 'A B C', ['A -> B', 'B -> C']],
  ['A <-> B -> C', 'A B C', ['A -> B', 'B -> A', 'B -> C']],
  ['A ⇌ B\n\nB → C\r\n', 'A B C', ['A -> B', 'B -> A', 'B -> C']],
  ['A<->B;B->C', 'A B C', ['A -> B', 'B -> A', 'B -> C']],
  ['A <=> B; B => C;', 'A B C', ['A -> B', 'B -> A', 'B -> C']],
  ['2NO2 <-> N2O4', 'NO2 N2O4', ['2 NO2 -> N2O4', 'N2O4 -> 2 NO2']],
  ['H2 + 1/2 O2 -> H2O', 'H2 O2 H2O', ['H2 + 0.5 O2 -> H2O']],
  ['H2O2 + 0.5 X -> .5 X', 'H2O2 X', ['H2O2 + 0.5 X -> 0.5 X']],
  ['A + A -> B', 'A B', ['2 A -> B']],
  ['A ->', 'A', ['A ->']],
  ['-> A', 'A', ['-> A']],
])('parseScheme(%j) reads species %s', (text, species, steps) =>
  expect(read(text)).toEqual({ species, steps }),
);

test.each([
  ['HCO3- + H+ <-> H2CO3', 'HCO3- H+ H2CO3'],
  ['A+ + B- -> AB', 'A+ B- AB'],
  ['Fe3+ + SO4-- -> FeSO4+', 'Fe3+ SO4-- FeSO4+'],
  ['Fe(3+) + e- -> Fe(2+)', 'Fe(3+) e- Fe(2+)'],
  ['[Fe(CN)6]3- + A_1 -> X*', '[Fe(CN)6]3- A_1 X*'],
  ['Cl-->X', 'Cl- X'],
  ['Na+->X', 'Na+ X'],
  ['Cl- --> X', 'Cl- X'],
  ['•OH + HCO₃⁻ -> CO₃•⁻', '•OH HCO₃⁻ CO₃•⁻'],
  ['no + NO -> No', 'no NO No'],
])('parseScheme(%j): charges and indices belong to the names %s', (text, species) =>
  expect(read(text).species).toBe(species),
);

test.each([
  ['A+B -> C', 'join species by a plus with a space on each side: "A+B" at character 1 of "A+B -> C"'],
  ['A +B -> C', 'join species by a plus with a space on each side: a plus at character 3 of "A +B -> C"'],
  ['A+ B -> C', 'join species by a plus with a space on each side: "B" at character 4 of "A+ B -> C"'],
  ['A + -> C', 'name a species here: none at character 5 of "A + -> C"'],
  ['+ A -> C', 'have species that start with a letter or a bracket: "+" at character 1 of "+ A -> C"'],
  ['A -> B; C + D', 'have an arrow in every step: none in the step at character 9 of "A -> B; C + D"'],
  ['A -> 2', 'name a species here: none at character 7 of "A -> 2"'],
  ['0 A -> B', 'have coefficients above 0: "0" at character 1 of "0 A -> B"'],
  ['0,5 A -> B', 'have coefficients above 0: "0" at character 1 of "0,5 A -> B"'],
  ['1/0 A -> B', 'have coefficients above 0: "1/0" at character 1 of "1/0 A -> B"'],
  ['Fe(3+ -> B', 'close every bracket of a species: "Fe(3+" at character 1 of "Fe(3+ -> B"'],
  ['Fe)3 -> B', 'close only brackets that were opened: ")" at character 3 of "Fe)3 -> B"'],
  ['A -> B; ->', 'name a species on at least one side of an arrow: none at character 9 of "A -> B; ->"'],
])('parseScheme(%j) is refused where it stops making sense', (text, words) =>
  expect(() => parseScheme(text)).toThrow(`scheme must ${words}`),
);

test.each(['', ' ', ';', '\n;\n'])('parseScheme(%j) holds no step', (text) =>
  expect(() => parseScheme(text)).toThrow('scheme must hold a step, such as A -> B: none was found'),
);

test('parseScheme of a long text shows the part that it means', () => {
  const text = `${'A -> B\n'.repeat(20)}x+y -> z`;
  expect(() => parseScheme(text)).toThrow(/"x\+y" at character 141 of "….{60}"$/);
});

test('a reaction’s net numbers leave out what comes through unchanged', () => {
  const [{ left, net }] = parseScheme('E + 2 S -> E + S + P').reactions;
  expect(left).toEqual([
    { species: 0, number: 1 },
    { species: 1, number: 2 },
  ]);
  expect(net).toEqual([
    { species: 1, number: -1 },
    { species: 2, number: 1 },
  ]);
});

test('reactionInWords names the coefficient and its direction', () =>
  expect(reactionInWords(parseScheme('A -> B; B <-> 2 C'), 2)).toBe('coefficient 3 (2 C -> B)'));
