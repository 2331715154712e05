/** Fits in a formula that is frozen: their numbers on the sheet "Workings", and whether they still fit. */
import { CellError } from '../../functions/cell';
import { NotSaid } from '../../functions/builtIn/said';
import { InvalidInput, NotDetermined } from '../../src/errors';
import { allCalls, callsIn } from './calls';
import { givenTo, type Scene } from './say';
import type { Position } from './world';

/** @returns the first cell of each table; none for a call whose readings stand in no cells, or that cannot be fitted */
export function watchFits(formula: string, position: Position, scene: Scene): string[] {
  const text = scene.world.spelledOut(formula, position);
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
