/** The ways to the help pages, which the same command serves. */
import type { BenchPage } from '../bench';

export function helpSuite(sheet: () => BenchPage): void {
  const opened = async (press: () => Promise<void>) => {
    const [popup] = await Promise.all([sheet().page.waitForEvent('popup'), press()]);
    await popup.waitForLoadState();
    return popup;
  };

  test('the strip leads to the start of help, and its search works under the rules of the server', async () => {
    const help = await opened(() =>
      sheet().page.locator('#strip').getByRole('link', { name: 'Help' }).click(),
    );
    await help.getByRole('heading', { name: 'Which function do I need?', level: 1 }).waitFor();
    await help.locator('#look-for').fill('burette');
    await help.locator('#found').getByRole('link', { name: 'PACE.GASVOLUME' }).click();
    await help.getByRole('heading', { name: 'PACE.GASVOLUME', level: 1 }).waitFor();
    expect(new URL(help.url()).pathname).toBe('/help/gasvolume.html');
    await help.close();
  });

  test('a function that is looked up leads to its page', async () => {
    const pane = sheet().page.locator('#pane');
    await pane
      .getByRole('tab', { name: 'Look up' })
      .or(pane.getByRole('button', { name: 'Look up' }))
      .first()
      .click();
    await pane.getByRole('button', { name: 'PACE.TANGENT' }).click();
    const help = await opened(() => pane.getByRole('link', { name: 'All about PACE.TANGENT' }).click());
    await help.getByRole('heading', { name: 'PACE.TANGENT', level: 1 }).waitFor();
    await help.close();
    await pane.getByRole('button', { name: 'All functions' }).click();
  });
}
