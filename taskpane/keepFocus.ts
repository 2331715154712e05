/**
 * Redraws the pane. Where that takes away what the keyboard was on, such as a button that has done its work, the focus
 * goes to the heading of the same step: left to itself it would be lost, and with it a screen reader's place.
 */
export function keepingFocus(pane: HTMLElement, redraw: () => void): void {
  const held = pane.contains(document.activeElement) ? document.activeElement : null;
  const step = held?.closest('section');
  redraw();
  if (!step || held!.isConnected) return;
  document.getElementById(`${step.id}-title`)?.focus({ preventScroll: true });
}
