/** What a person has chosen at each step, as typed: an empty field is an argument left out. */

/** The steps of the work; one is open at a time. */
export type Task = 'reading' | 'rate' | 'order' | 'many' | 'temperature' | 'handOver' | 'lookUp';

export type RateKind = 'average' | 'tangent' | 'column';

export interface RateChoice {
  readonly kind: RateKind;
  readonly from: string;
  readonly to: string;
  readonly time: string;
  readonly points: string;
  readonly degree: string;
  readonly coefficient: string;
}

/** What was measured, and under which conditions. */
export interface ReadingChoice {
  /** The function that converts it; empty where the readings stand as they are. */
  readonly what: string;
  /** By the function's own parameters. */
  readonly inputs: Readonly<Record<string, string>>;
  /** Which runs are converted; `null` for all where they stand under each other, else the chosen one. */
  readonly runs: 'this' | 'all' | null;
  /** Of all runs that stand under each other: one column through them, or times and answers of each side by side. */
  readonly layout: 'column' | 'pairs';
}

/** The reading at infinite time: left out, which means 0, or a number or cell, or fitted. */
export type EndpointKind = 'zero' | 'given' | 'free';

/** What of the order step goes into the sheet. */
export type OrderAnswerKind = 'coefficient' | 'halfLife' | 'order' | 'curve' | 'orders';

export interface OrderChoice {
  /** A number, or `free` to have it fitted. */
  readonly order: string;
  readonly endpointKind: EndpointKind;
  readonly endpoint: string;
  readonly answer: OrderAnswerKind;
}

/** What is put in for every picked run. */
export type ManyAnswer = 'survey' | 'order' | 'rate';

export interface ManyChoice {
  /** By their keys; `null` for all that are like the chosen run. */
  readonly picked: readonly number[] | null;
  readonly answer: ManyAnswer;
}

export type TemperatureAnswerKind = 'energy' | 'coefficient';

export interface TemperatureChoice {
  /** Columns of the sheet; `null` for those that the headings suggest, or for none. */
  readonly temperatures: number | null;
  readonly coefficients: number | null;
  readonly uncertainties: number | null;
  /** Where a coefficient is asked for. */
  readonly at: string;
  readonly answer: TemperatureAnswerKind;
}

export interface LookupChoice {
  readonly words: string;
  /** The function whose help is open; empty for the list. */
  readonly chosen: string;
}

export interface PutChoice {
  /** As typed: `'Gas run'!E3`. */
  readonly target: string;
  /** Once the person has typed a target, the pane stops proposing others. */
  readonly isOwn: boolean;
  readonly withHeading: boolean;
  readonly withDetail: boolean;
  readonly withChart: boolean;
  /** Cells to be filled that hold something now. */
  readonly inUse: readonly string[];
  /** The person has asked to write: say yes or no to these cells. */
  readonly question: readonly string[] | null;
}

export const firstChoices: Choices = {
  reading: { what: '', inputs: {}, runs: null, layout: 'column' },
  rate: { kind: 'tangent', from: '', to: '', time: '', points: '', degree: '', coefficient: '' },
  order: { order: '1', endpointKind: 'zero', endpoint: '', answer: 'coefficient' },
  many: { picked: null, answer: 'survey' },
  temperature: { temperatures: null, coefficients: null, uncertainties: null, at: '', answer: 'energy' },
  lookup: { words: '', chosen: '' },
  put: {
    target: '',
    isOwn: false,
    withHeading: true,
    withDetail: false,
    withChart: false,
    inUse: [],
    question: null,
  },
};

export interface Choices {
  readonly reading: ReadingChoice;
  readonly rate: RateChoice;
  readonly order: OrderChoice;
  readonly many: ManyChoice;
  readonly temperature: TemperatureChoice;
  readonly lookup: LookupChoice;
  readonly put: PutChoice;
}
