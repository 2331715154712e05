/** Words of ours in the workbook's own settings, which are saved with it. */
import type { WorkbookMemory } from '../port';
import { answered } from './answered';

const keyOf = (name: string): string => `flaskpace.${name}`;

export const documentMemory: WorkbookMemory = {
  recall(name) {
    const kept: unknown = Office.context.document.settings.get(keyOf(name));
    return typeof kept === 'string' ? kept : null;
  },
  async keep(name, words) {
    const { settings } = Office.context.document;
    settings.set(keyOf(name), words);
    await answered<void>((done) => settings.saveAsync(done));
  },
};
