/** What crosses to the thread that makes a copy, and back: plain data. */
import type { HandedCopy } from '../../taskpane/copying';
import type { Origin } from '../handover/methodSheet';

export interface CopyJob {
  readonly bytes: Uint8Array;
  readonly origin: Origin;
}

export type CopyAnswer = { readonly copy: HandedCopy } | { readonly refused: string };
