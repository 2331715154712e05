/** What was measured, and the amount or concentration that it stands for. */
import type { Actions } from '../actions';
import { pickedRuns } from '../calls/many';
import { convertedHeading, readingFormula, type ReadingAnswer } from '../calls/reading';
import type { ReadingChoice } from '../choices';
import { plainNumber } from '../../functions/format';
import { h, type Child } from '../h';
import { headingsFor } from '../insertions/insertion';
import { plainPlot, runPlot } from '../plots/runPlot';
import { columnOf, headingOf, type Run, type Table } from '../runs';
import type { CellFunction } from '../../functions/define';
import type { Scene } from '../scene';
import { asItIs, fieldsOf, functionOf, signals, unitProblem } from '../signals';
import { result } from './estimate';
import { choiceOfOne, selectField, step } from './fields';
import { formulaLine } from './formulaLine';
import { howItIsWorkedOut } from './howItIsWorkedOut';
import { pointedField } from './pointedField';

const choices = [
  { value: asItIs, label: 'already an amount or concentration' },
  ...signals.map(({ functionName, label }) => ({ value: functionName, label })),
];

export function readingStep(scene: Scene, actions: Actions): HTMLElement {
  const { state, reading: answer } = scene;
  const { table, run, reading } = state;
  if (!table || !run || !answer)
    return step('reading', 'Reading', h('p', { className: 'hint' }, 'Choose a run first.'));
  const f = functionOf(reading.what);
  const what = selectField(
    'reading-what',
    'What was measured',
    choices,
    reading.what,
    (chosen) => void actions.changeSignal(chosen),
  );
  if (!f)
    return step(
      'reading',
      'Reading',
      what,
      h(
        'p',
        { className: 'hint' },
        'The readings are taken as they are. Anything in proportion to a concentration will do for an order and a half life.',
      ),
      plainPlot(table, run),
    );
  const pointing = { sheet: table.sheet, pointedAt: state.pointedAt };
  const problem = unitProblem(f, headingOf(table, run.readingColumn));
  return step(
    'reading',
    'Reading',
    what,
    h('p', { className: 'hint' }, f.summary),
    problem !== '' && h('p', { className: 'warning' }, problem),
    ...whichRuns(scene, actions),
    ...inputs(f, reading, answer, actions),
    ...drawing(f, table, run, answer),
    result(...inWords(f, table, run, answer), ...refusals(scene)),
    formulaLine({ formula: readingFormula(f, table, run, reading, pointing), sheet: table.sheet }, actions),
    howItIsWorkedOut(f),
    f.caution !== undefined && h('p', { className: 'caution' }, f.caution),
  );
}

/** Asked only where several are read alike. */
function whichRuns({ state: { table, run, reading }, readings }: Scene, actions: Actions): Child[] {
  const alike = pickedRuns(table!, run!, { picked: null });
  if (alike.length < 2) return [];
  const isAll = readings.length > 1;
  return [
    choiceOfOne(
      'reading-runs',
      'Convert',
      [
        ['all', `all ${alike.length} runs`],
        ['this', 'this run'],
      ],
      isAll ? 'all' : 'this',
      (runs) => void actions.changeReading({ runs }),
    ),
    isAll &&
      table!.stretches.length > 0 &&
      choiceOfOne(
        'reading-layout',
        'Laid out',
        [
          ['column', 'in one column, each in its own rows'],
          ['pairs', 'side by side, each with its times'],
        ],
        reading.layout,
        (layout) => void actions.changeReading({ layout }),
      ),
  ];
}

/** Of the other runs, where they are refused for another reason than the chosen one. */
function refusals({ reading, readings }: Scene): Child[] {
  const own = reading?.kind === 'refused' ? reading.words : '';
  const refused = readings.flatMap(({ name, answer }) =>
    answer.kind === 'refused' && answer.words !== own ? [`${name}: ${answer.words}`] : [],
  );
  const more = refused.length > 1 ? `; and ${refused.length - 1} more` : '';
  return [refused.length > 0 && h('p', { className: 'problem' }, `${refused[0]}${more}`)];
}

/** What must be known first; what has a default can be opened. */
function inputs(f: CellFunction, reading: ReadingChoice, answer: ReadingAnswer, actions: Actions): Child[] {
  const all = fieldsOf(f).map(({ name, parameter }) => ({
    isOptional: parameter.optional,
    isFilled: (reading.inputs[name] ?? '') !== '',
    element: pointedField(
      {
        id: `reading-${name}`,
        name,
        parameter,
        value: reading.inputs[name] ?? '',
        problem: answer.kind === 'refused' && answer.field === name ? answer.words : null,
        change: (typed) => actions.changeReading({ inputs: { ...reading.inputs, [name]: typed } }),
      },
      actions,
    ),
  }));
  const optional = all.filter(({ isOptional }) => isOptional);
  return [
    ...all.filter(({ isOptional }) => !isOptional).map(({ element }) => element),
    optional.length > 0 &&
      h(
        'details',
        { open: optional.some(({ isFilled }) => isFilled) },
        h('summary', {}, 'Conditions with a default'),
        ...optional.map(({ element }) => element),
      ),
  ];
}

function drawing(f: CellFunction, table: Table, run: Run, answer: ReadingAnswer): Child[] {
  if (answer.kind !== 'column') return [];
  const { text, unit } = convertedHeading(f, table, run);
  const [heading] = headingsFor(text, unit, false);
  const times = columnOf(table, run.timeColumn, run);
  const points = times.flatMap(([time], row) => {
    const value = answer.cells[row]?.[0];
    return typeof time === 'number' && typeof value === 'number' ? [{ time, value }] : [];
  });
  return [
    runPlot({
      points,
      time: headingOf(table, run.timeColumn),
      reading: { text: heading, unit, quantity: 'unknown' },
    }),
  ];
}

function inWords(f: CellFunction, table: Table, run: Run, answer: ReadingAnswer): Child[] {
  switch (answer.kind) {
    case 'missing':
      return [h('p', { className: 'hint' }, `Still needed: ${answer.names.join(', ')}`)];
    case 'refused':
      return [
        answer.field === null
          ? h('p', { className: 'problem' }, answer.words)
          : h('p', { className: 'hint' }, 'No answer yet: see the field marked above.'),
      ];
    case 'column': {
      const { text, unit } = convertedHeading(f, table, run);
      const values = answer.cells.flat().filter((cell) => typeof cell === 'number');
      if (values.length === 0) return [h('p', { className: 'problem' }, 'no reading could be converted')];
      const [first, last] = [values[0], values[values.length - 1]].map((value) => plainNumber(value));
      const from = unit === '1' ? '' : ` ${unit}`;
      return [h('p', {}, `${text} from ${first} to ${last}${from}`)];
    }
    case 'as it is':
      return [];
  }
}
