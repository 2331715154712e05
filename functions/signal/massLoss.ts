import { amountLost, amountLostEstimate, massPerMole, requireVisibleLoss } from '../../src/signal/massLoss';
import { molarMass } from '../../src/signal/molarMass';
import { convertColumn, convertToRows, firstNumber, requireLine, type Column } from '../column';
import { detail } from '../commonParameters';
import { sayMassLoss } from '../builtIn/gas';
import { defineFunction } from '../define';
import { number, optional, readings, text } from '../parameters';
import { quantity } from '../quantityParameters';
import { standardRow, unknownUncertaintyRow } from '../results';

export default defineFunction({
  name: 'MASSLOSS',
  family: 'reading',
  summary: 'Amount of gas gone, mol, from the mass of the vessel that it leaves.',
  method:
    'n = (m₀ − m)/M. With a temperature, M also counts the water vapour that the gas carries off saturated, M(H₂O)p*/(p − p*) per mole of gas. A readability d gives each loss the standard uncertainty d/√6 (GUM F.2.2.1), and a run whose largest loss stays below 3.29 of these cannot be seen (detection limit, Currie 1995).',
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
