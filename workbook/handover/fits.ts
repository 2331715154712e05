/** Fits in a formula that is frozen: their numbers on the sheet "Workings", and whether they still fit. */
import { CellError } from '../../functions/cell';
import { NotSaid } from '../../functions/builtIn/said';
import { InvalidInput, NotDetermined } from '../../src/errors';
import { allCalls, callsIn } from './calls';
import { givenTo, type Scene } from './say';
import type { Position } from './world';

/** Formulas filled down often ask for one and the same fit: each is made once. */
export class FitWatch {
  private readonly known = new Map<string, string[]>();

  /** @returns the first cell of each table; none for a call whose readings stand in no cells, or that cannot be fitted */
  placesOf(formula: string, position: Position, scene: Scene): string[] {
    const text = scene.world.spelledOut(formula, position);
    const key = `${scene.sheet}!${text}`;
    const places = this.known.get(key) ?? watchFits(text, scene);
    this.known.set(key, places);
    return places;
  }
}

function watchFits(text: string, scene: Scene): string[] {
  const places = allCalls(callsIn(text)).flatMap((call): string[] => {
    const { fits } = call.f;
    if (!fits) return [];
    try {
      return scene.workings.attempt(() => {
        const given = givenTo(call, text, scene, (own) => ({ text: own }));
        return [fits(given).cell(0, 0)];
      });
    } catch (error) {
      const isExpected = [NotSaid, InvalidInput, NotDetermined, CellError].some(
        (kind) => error instanceof kind,
      );
      if (isExpected) return [];
      throw error;
    }
  });
  return [...new Set(places)];
}
