import { NotDetermined, shown } from '../../errors';
import { fitRateLaw, type RateLawFit } from '../../order/fit';
import { halfLivesFollowed } from '../../order/verdict';
import type { Series } from '../series';
import type { Course } from './course';
import type { Finding } from './finding';
import { percent, roughly } from './words';

/** Below this share the change is a straight line to most instruments (common practice for initial rates). */
const initialShare = 0.1;

/** Below two half lives neighbouring orders differ by less than most readings scatter (common practice). */
const halfLivesNeeded = 2;

/**
 * How far a run was followed that is still on its way.
 *
 * A falling run is taken to end at 0, as the fits take it when no end is given, unless a first-order curve
 * with a free end shows it to flatten out elsewhere, as a balance does. A rising one has no end of its own:
 * such a curve says how much of it was seen.
 */
export function conversion({ series, direction }: Course): Finding | null {
  return direction < 0 ? falling(series) : direction > 0 ? rising(series) : null;
}

function falling(series: Series): Finding | null {
  const { values } = series;
  const [first, last] = [values[0], values[values.length - 1]];
  if (first <= 0 || last <= 0) return null; // its end cannot be 0, or is reached
  const share = 1 - last / first;
  const followed = -Math.log2(1 - share);
  if (followed >= halfLivesNeeded) return null;
  const seen = `the readings went from ${shown(first)} to ${shown(last)}`;
  const way = `${percent(share)} of the way to 0 (${roughly(followed)} half lives)`;
  const end = endInSight(series);
  return end === null
    ? tooShort(share, `${seen}, ${way}`, 'if they end elsewhere than at 0, give that endpoint')
    : endsElsewhere(`${seen} and seem to level off near ${end}, not at 0`, end, way);
}

/** The end has to be clear of 0 by so many of its standard uncertainties, and known to this share of the change. */
const clearOfZero = 3;
const knownShare = 0.2;

/** Where a falling run flattens out, if not at 0 and if that can be seen; as many figures as its change is worth. */
function endInSight(series: Series): string | null {
  const free = freeEndFit(series);
  const uncertainty = free?.standardUncertainties.endpoint ?? Infinity;
  if (!free || halfLivesFollowed(free) < halfLivesNeeded) return null;
  const { endpoint, start } = free;
  const isClear = endpoint > clearOfZero * uncertainty && uncertainty < knownShare * (start - endpoint);
  const decimals = Math.max(0, 2 - Math.floor(Math.log10(start - endpoint)));
  return isClear ? String(Number(endpoint.toFixed(Math.min(12, decimals)))) : null;
}

function rising(series: Series): Finding | null {
  if (series.distinctTimes < readingsForFreeEnd) return null;
  const free = freeEndFit(series);
  const { values } = series;
  const seen = `the readings rose from ${shown(values[0])} to ${shown(values[values.length - 1])}`;
  const advice = 'give the endpoint if it is known';
  if (!free) return endless(`${seen} and show no sign of an end`, advice);
  const followed = halfLivesFollowed(free);
  if (followed >= halfLivesNeeded) return null;
  const share = 1 - free.shareLeft;
  return tooShort(
    share,
    `${seen}, ${percent(share)} of the way to their end if they follow first order (${roughly(followed)} half lives)`,
    advice,
  );
}

/** Three parameters, and one reading more to judge them by. */
const readingsForFreeEnd = 4;

/** A first-order curve with a free end; `null` where no end comes into sight. */
function freeEndFit(series: Series): RateLawFit | null {
  try {
    return series.distinctTimes < readingsForFreeEnd
      ? null
      : fitRateLaw(series, { order: 1, endpoint: 'free' });
  } catch (error) {
    if (error instanceof NotDetermined) return null;
    throw error;
  }
}

function tooShort(share: number, finding: string, end: string): Finding {
  const isInitial = share < initialShare;
  return {
    kind: 'conversion',
    places: [],
    finding,
    meaning: isInitial
      ? 'enough for an initial rate, not for an order or a half life: over so small a change every order looks like a straight line'
      : 'rates are sound, but neighbouring orders cannot be told apart, and a rate coefficient holds only for the order that is assumed',
    advice: `${isInitial ? 'use it for an initial rate' : 'follow the run for three half lives or more before an order is quoted'}; ${end}`,
  };
}

const endless = (finding: string, advice: string): Finding => ({
  kind: 'conversion',
  places: [],
  finding,
  meaning:
    'rates are sound, but how far the reaction has come cannot be told, and so neither an order nor a half life',
  advice: `follow the run until it slows down; ${advice}`,
});

const endsElsewhere = (finding: string, end: string, way: string): Finding => ({
  kind: 'end',
  places: [],
  finding,
  meaning: 'an end of 0, taken when none is given, would spoil order, rate coefficient and half life',
  advice: `give ${end}, or "free", as the endpoint if the reading ends there; if it does end at 0, follow the run further, since it has only gone ${way}`,
});
