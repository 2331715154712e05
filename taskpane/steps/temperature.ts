/** How rate coefficients move with temperature, and what one would be at another. */
import { functionNamed } from '../../functions/catalogue';
import type { Actions } from '../actions';
import {
  columnsFor,
  knowsTemperatures,
  temperatureFormula,
  type TemperatureAnswer,
} from '../calls/temperature';
import type { TemperatureAnswerKind } from '../choices';
import { plainNumber } from '../../functions/format';
import { h, type Child } from '../h';
import { arrheniusPlot } from '../plots/arrheniusPlot';
import { headingOf, type Table } from '../runs';
import type { Scene } from '../scene';
import { columnField } from './columnField';
import { estimateLines, result } from './estimate';
import { selectField, step } from './fields';
import { formulaLine } from './formulaLine';
import { pointedField } from './pointedField';

const answers: readonly { readonly value: TemperatureAnswerKind; readonly label: string }[] = [
  { value: 'energy', label: 'activation energy' },
  { value: 'coefficient', label: 'rate coefficient at that temperature' },
];

export function temperatureStep({ state, temperature: answer }: Scene, actions: Actions): HTMLElement {
  const { table, run, temperature, put, pointedAt } = state;
  if (!table || !run || !answer)
    return step(
      'temperature',
      'Temperature',
      h('p', { className: 'hint' }, 'Click a cell in a table of temperatures and rate coefficients.'),
    );
  const pointing = { sheet: table.sheet, pointedAt };
  const { predicted } = answer;
  const isRefused = predicted && 'refused' in predicted && /^temperature /.test(predicted.refused);
  return step(
    'temperature',
    'Temperature',
    ...columnFields(table, columnsFor(table, temperature), actions),
    !knowsTemperatures(table, temperature) &&
      h('p', { className: 'warning' }, 'No heading names a temperature: choose the column that holds it.'),
    answer.line.length > 0 &&
      arrheniusPlot(answer, headingOf(table, columnsFor(table, temperature).coefficients)),
    result(...energyInWords(answer)),
    pointedField(
      {
        id: 'temperature-at',
        name: 'k at',
        parameter: functionNamed('COEFFICIENTAT')!.parameters.temperature,
        value: temperature.at,
        problem: isRefused ? predicted.refused : null,
        change: (at) => actions.changeTemperature({ at }),
      },
      actions,
    ),
    result(...predictedInWords(table, state, answer)),
    selectField(
      'temperature-answer',
      'What to put in',
      answers,
      temperature.answer,
      (chosen) => void actions.changeTemperature({ answer: chosen as TemperatureAnswerKind }),
    ),
    formulaLine(temperatureFormula(table, run, temperature, pointing, put.withDetail), actions),
  );
}

function columnFields(table: Table, chosen: ReturnType<typeof columnsFor>, actions: Actions): Child[] {
  const none = { value: '', label: 'none: the same share of each' };
  return [
    h(
      'div',
      { className: 'pair' },
      columnField('temperatures', 'Temperatures', table, chosen.temperatures, (temperatures) =>
        actions.changeTemperature({ temperatures }),
      ),
      columnField('coefficients', 'Rate coefficients', table, chosen.coefficients, (coefficients) =>
        actions.changeTemperature({ coefficients }),
      ),
    ),
    columnField(
      'uncertainties',
      'Their standard uncertainties',
      table,
      chosen.uncertainties,
      (uncertainties) => actions.changeTemperature({ uncertainties }),
      none,
    ),
  ];
}

function energyInWords({ energy, logFactor }: TemperatureAnswer): Child[] {
  if ('refused' in energy) return [h('p', { className: 'problem' }, energy.refused)];
  return [
    ...estimateLines('activation energy', energy.ok, 'kJ/mol'),
    logFactor && h('p', { className: 'hint' }, `ln A ${plainNumber(logFactor.value)}, A in the unit of k`),
  ];
}

/** What lies outside the temperatures measured is marked, and never without its caution. */
function predictedInWords(
  table: Table,
  { temperature }: Scene['state'],
  { predicted }: TemperatureAnswer,
): Child[] {
  if (!predicted) return [];
  if ('refused' in predicted)
    return [!/^temperature /.test(predicted.refused) && h('p', { className: 'problem' }, predicted.refused)];
  const { unit } = headingOf(table, columnsFor(table, temperature).coefficients);
  return [
    ...estimateLines('rate coefficient at that temperature', predicted.ok, unit),
    predicted.isExtrapolated &&
      h(
        'p',
        { className: 'warning' },
        h('strong', {}, 'Extrapolated: '),
        'it lies outside the temperatures measured, and takes for granted that the same law holds there',
      ),
    h('p', { className: 'caution' }, functionNamed('COEFFICIENTAT')!.caution),
  ];
}
