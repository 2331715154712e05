/** How rate coefficients move with temperature, and what one would be at another. */
import { functionNamed } from '../../functions/catalogue';
import type { Actions } from '../actions';
import {
  columnsFor,
  knowsTemperatures,
  temperatureFormula,
  type Columns,
  type TemperatureAnswer,
} from '../calls/temperature';
import type { TemperatureAnswerKind, TemperatureChoice } from '../choices';
import { plainNumber } from '../../functions/format';
import { h, type Child } from '../h';
import { arrheniusPlot } from '../plots/arrheniusPlot';
import { headingOf, type Table } from '../runs';
import type { Scene } from '../scene';
import { columnField } from './columnField';
import { estimateLines, result } from './estimate';
import { selectField, step, type Choice } from './fields';
import { formulaLine } from './formulaLine';
import { pointedField } from './pointedField';

const answers: readonly { readonly value: TemperatureAnswerKind; readonly label: string }[] = [
  { value: 'energy', label: 'activation energy' },
  { value: 'coefficient', label: 'rate coefficient at that temperature' },
];

export function temperatureStep({ state, temperature: answer }: Scene, actions: Actions): HTMLElement {
  const { table, run, temperature, put, pointedAt } = state;
  if (!table || !run)
    return step(
      'temperature',
      'Temperature',
      h('p', { className: 'hint' }, 'Click a cell in a table of temperatures and rate coefficients.'),
    );
  const columns = columnsFor(table, temperature);
  const formula = temperatureFormula(
    table,
    run,
    temperature,
    { sheet: table.sheet, pointedAt },
    put.withDetail,
  );
  if (!answer || !columns || formula === null)
    return step('temperature', 'Temperature', ...columnFields(table, temperature, actions), toBeChosen());
  const { predicted } = answer;
  const isRefused = predicted && 'refused' in predicted && /^temperature /.test(predicted.refused);
  return step(
    'temperature',
    'Temperature',
    ...columnFields(table, columns, actions),
    !knowsTemperatures(table, temperature) && toBeChosen(),
    answer.line.length > 0 && arrheniusPlot(answer, headingOf(table, columns.coefficients)),
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
    result(...predictedInWords(headingOf(table, columns.coefficients).unit, answer)),
    selectField(
      'temperature-answer',
      'What to put in',
      answers,
      temperature.answer,
      (chosen) => void actions.changeTemperature({ answer: chosen as TemperatureAnswerKind }),
    ),
    formulaLine({ formula, sheet: table.sheet }, actions),
  );
}

const toBeChosen = (): HTMLElement =>
  h(
    'p',
    { className: 'warning', role: 'status' },
    'No heading names a temperature: choose the column that holds it.',
  );

/** One that nobody knows yet stands open. */
function columnFields(
  table: Table,
  chosen: Pick<TemperatureChoice, keyof Columns>,
  actions: Actions,
): Child[] {
  const open = (column: number | null): Choice | undefined =>
    column === null ? { value: '', label: 'choose' } : undefined;
  const none = { value: '', label: 'none: the same share of each' };
  return [
    h(
      'div',
      { className: 'pair' },
      columnField(
        'temperatures',
        'Temperatures',
        table,
        chosen.temperatures,
        (temperatures) => actions.changeTemperature({ temperatures }),
        open(chosen.temperatures),
      ),
      columnField(
        'coefficients',
        'Rate coefficients',
        table,
        chosen.coefficients,
        (coefficients) => actions.changeTemperature({ coefficients }),
        open(chosen.coefficients),
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
function predictedInWords(unit: string, { predicted }: TemperatureAnswer): Child[] {
  if (!predicted) return [];
  if ('refused' in predicted)
    return [!/^temperature /.test(predicted.refused) && h('p', { className: 'problem' }, predicted.refused)];
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
