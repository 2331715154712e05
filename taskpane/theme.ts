/** Light or dark, as the host is where it says so, and else as the system is. The style sheets go by `data-theme`. */

const system = (): MediaQueryList => window.matchMedia('(prefers-color-scheme: dark)');

/**
 * @param tell of every change
 * @param hostIsDark asked again whenever the page comes into view, since hosts do not tell of a change
 * @returns whether it is dark to begin with
 */
export function followTheme(
  tell: (isDark: boolean) => void = () => undefined,
  hostIsDark: () => boolean | undefined = () => undefined,
): boolean {
  const isDarkNow = (): boolean => hostIsDark() ?? system().matches;
  const show = (isDark: boolean): void => {
    document.documentElement.dataset.theme = isDark ? 'dark' : 'light';
  };
  let isDark = isDarkNow();
  const follow = (): void => {
    if (isDarkNow() === isDark) return;
    isDark = !isDark;
    show(isDark);
    tell(isDark);
  };
  system().addEventListener('change', follow);
  window.addEventListener('focus', follow);
  show(isDark);
  return isDark;
}
