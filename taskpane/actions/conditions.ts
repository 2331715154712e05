/** The conditions of a conversion, kept with the workbook once it was put in, so that they need not be typed again. */
import type { ReadingChoice } from '../choices';
import type { Bench } from './bench';

const nameOf = (what: string): string => `conditions of ${what}`;

export async function keepConditions({ port }: Pick<Bench, 'port'>, reading: ReadingChoice): Promise<void> {
  try {
    await port.memory?.keep(nameOf(reading.what), JSON.stringify(reading.inputs));
  } catch {
    // a document that takes no settings, such as a protected one, takes the formula all the same
  }
}

/** By parameter, as they were typed; nothing where none are kept, or what is there is not ours. */
export function keptConditions({ port }: Pick<Bench, 'port'>, what: string): ReadingChoice['inputs'] {
  try {
    const inputs = Object.entries(JSON.parse(port.memory?.recall(nameOf(what)) ?? '{}') as object);
    return Object.fromEntries(inputs.filter((one): one is [string, string] => typeof one[1] === 'string'));
  } catch {
    return {};
  }
}
