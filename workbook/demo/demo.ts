/** The workbook that opens first: three runs of an invented lab that makes effervescent cleaning tablets. */
import type { BookModel } from '../engine/engine';
import { dyeRun } from './dyeRun';
import { gasRun } from './gasRun';
import { massLossRun } from './massLossRun';

export const demoWorkbook = (): BookModel => ({ sheets: [gasRun(), massLossRun(), dyeRun()], names: [] });
