import { amountLost, amountLostEstimate, massPerMole, requireVisibleLoss } from '../../src/signal/massLoss';
import { molarMass } from '../../src/signal/molarMass';
import { convertColumn, convertToRows, firstNumber, requireLine, type Column } from '../column';
import { detail } from '../commonParameters';
import { sayMassLoss } from '../builtIn/gas';
import { defineFunction } from '../define';
import { uncertaintyOf } from '../uncertaintyOf';
import { number, optional, readings, text } from '../parameters';
import { quantity } from '../quantityParameters';
import { standardRow, unknownUncertaintyRow } from '../results';

export default defineFunction({
  name: 'MASSLOSS',
  family: 'reading',
  summary: 'Amount of gas gone, mol, from the mass of the vessel that it leaves.',
  equations: {
    lines: ['n = (m₀ − m)/M', 'M = M_gas + M_w p*/(p − p*)', 'u_n = δ/(M√6)'],
    where: {
      n: 'amount of gas gone, mol',
      'm₀': 'mass at the start',
      m: 'mass read',
      M: 'mass that leaves with each mole of gas',
      M_gas: 'molar mass of the gas',
      M_w: 'molar mass of water',
      'p*': 'vapour pressure of water at the temperature; 0 for a dry gas',
      p: 'pressure of the room',
      u_n: 'standard uncertainty of n',
      δ: 'readability, the smallest step of the balance',
    },
  },
  method:
    'With a temperature, each mole of gas carries off the water vapour that saturates it, and M counts it. With a readability δ, a run whose largest loss stays below 3.29 standard uncertainties cannot be seen (detection limit, Currie 1995).',
  uncertainty: uncertaintyOf.readability,
  parameters: {
    masses: readings({
      help: 'mass of the vessel with its contents, or the change a tared balance shows',
      unit: 'g',
    }),
    gas: text({ help: 'formula of the gas, such as "CO2", or its molar mass in g/mol', orNumber: true }),
    start: optional(number({ help: 'mass at the start', unit: 'g' }), undefined, 'the first mass'),
    readability: optional(
      number({ help: 'smallest step of the balance', unit: 'g', above: 0 }),
      undefined,
      'no uncertainty, and no check whether the loss can be seen',
    ),
    temperature: optional(
      quantity({ help: 'of the gas as it leaves, saturated with water', unit: 'degC', to: 'K', atLeast: 0 }),
      undefined,
      'a dry gas',
    ),
    pressure: optional(
      quantity({ help: 'of the room', unit: 'kPa', to: 'Pa', above: 0 }),
      101325,
      '101.325 kPa',
    ),
    detail: detail(),
  },
  result: { unit: 'mol', shape: 'as given' },
  // 0.44009 g of CO2, at 44.009 g/mol (standard atomic weights 2021)
  example: { formula: '=PACE.MASSLOSS({187.352;186.91191},"CO2")', equals: [[0], [0.01]] },
  refusals: [
    {
      formula: '=PACE.MASSLOSS({100;99.99},"H2",,0.01)',
      mend: 'Use a finer balance, a larger batch, or catch the gas: the loss is too small for this balance.',
    },
    {
      formula: '=PACE.MASSLOSS({100;99},"C02")',
      mend: 'Write CO2 with the letter O. A formula is made of element symbols and counts; the molar mass in g/mol will do as well.',
    },
    {
      formula: '=PACE.MASSLOSS({100;99},"CO2",,,"100 degC",101)',
      mend: 'Check temperature and pressure: at these the water boils.',
    },
  ],
  seeAlso: ['REMAINING', 'TANGENT', 'GASVOLUME'],
  reference: 'doi:10.1515/pac-2019-0603; doi:10.1351/pac199567101699; JCGM 100:2008',
  caution:
    'Never close the vessel to keep spray in: the gas must leave freely. A loose plug of glass wool holds the spray. Local rules come first.',
  run({ masses, gas, start, readability, temperature, pressure, detail }) {
    const perMole = massPerMole(
      typeof gas === 'number' ? gas : molarMass(gas),
      temperature === undefined ? undefined : { temperature, pressure },
    );
    const from = start ?? firstNumber(masses, 'masses').value;
    if (readability !== undefined) requireVisibleLoss(largestLoss(masses, from), readability);
    if (!detail) return convertColumn(masses, (mass) => amountLost(mass, from, perMole));
    requireLine(masses, 'masses');
    return convertToRows(masses, (mass) =>
      readability === undefined
        ? unknownUncertaintyRow(amountLost(mass, from, perMole), 'give the readability of the balance')
        : standardRow(amountLostEstimate(mass, from, perMole, readability)),
    );
  },
  builtIn: sayMassLoss,
});

const largestLoss = ({ numbers }: Column, start: number): number =>
  numbers.reduce<number>((most, mass) => (mass === null ? most : Math.max(most, start - mass)), 0);
