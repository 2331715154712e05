/** The workbook that opens first: runs of an invented lab that makes effervescent cleaning tablets. */
import type { BookModel } from '../engine/engine';
import { doses } from './doses';
import { dyeRun } from './dyeRun';
import { everyFunction } from './everyFunction';
import { gasRun } from './gasRun';
import { massLossRun } from './massLossRun';
import { stability } from './stability';
import { timingCard } from './timingCard';
import { twoSteps } from './twoSteps';

export const demoWorkbook = (): BookModel => ({
  sheets: [
    gasRun(),
    massLossRun(),
    dyeRun(),
    doses(),
    timingCard(),
    stability(),
    twoSteps(),
    everyFunction(),
  ],
  names: [],
});
