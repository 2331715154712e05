/** F6 goes from one part of the page to the next, Shift+F6 back: inside the grid, Tab moves between cells. */
export interface Region {
  readonly element: HTMLElement;
  /** Where the keyboard goes; left out, to the first control that can take it. */
  focus?(): void;
}

/** @returns a function that stops listening */
export function moveBetween(regions: readonly Region[]): () => void {
  const onKey = (event: KeyboardEvent): void => {
    if (event.key !== 'F6' || event.ctrlKey || event.altKey || event.metaKey) return;
    event.preventDefault();
    event.stopPropagation();
    const here = regions.findIndex(({ element }) => element.contains(document.activeElement));
    const step = event.shiftKey ? -1 : 1;
    const next = here < 0 ? 0 : (here + step + regions.length) % regions.length;
    focusRegion(regions[next]);
  };
  // before the grid, which keeps keys to itself
  window.addEventListener('keydown', onKey, { capture: true });
  return () => window.removeEventListener('keydown', onKey, { capture: true });
}

const focusable =
  'button:not(:disabled), input:not(:disabled), select:not(:disabled), summary, a[href], [tabindex="0"]';

function focusRegion({ element, focus }: Region): void {
  if (focus) focus();
  else element.querySelector<HTMLElement>(focusable)?.focus();
}
