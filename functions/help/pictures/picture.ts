/** What a picture of the help pages is: some panels with one explanation. All numbers in it are worked out. */
import type { Shape } from '../../drawing/shape';

export interface Picture {
  /** Its part of the page of pictures. */
  readonly name: string;
  readonly title: string;
  /** Functions on whose pages it stands. */
  readonly functions: readonly string[];
  /** Under it: what to see, one thought a sentence. */
  readonly caption: string;
  readonly panels: readonly Panel[];
}

export interface Panel {
  readonly heading: string;
  /** Each panel says in its label what someone would hear who cannot see it. */
  readonly drawn: Shape;
}

/** Of one panel, in its own units. */
export const panelSize = { width: 360, height: 216 };
