/** Where the pane runs, and notices above it. The one place that knows the helper library for both. */
import { UI, Utilities } from '@microsoft/office-js-helpers';

/** Its names for hosts, as a person would say them. */
const hosts: Readonly<Record<string, string>> = { EXCEL: 'Excel' };

/** @returns `Excel`, or `null` outside of it; true only once Office is ready */
export function hostName(): string | null {
  if (typeof window === 'undefined' || typeof Office === 'undefined') return null;
  return hosts[String(Utilities.host).toUpperCase()] ?? null;
}

/** A banner at the top, which the person closes: for what must not be missed. */
export function notice(words: string, title = 'Flaskpace'): void {
  if (typeof document === 'undefined') return;
  UI.notify(words, title, 'warning');
  // the banner's close button comes without a name
  const banner = document.querySelector('.office-js-helpers-notification');
  banner?.setAttribute('role', 'alert');
  banner?.querySelector('button')?.setAttribute('aria-label', 'Close this notice');
}
