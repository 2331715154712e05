/** @jest-environment jsdom */
import { hostName, notice } from '../../taskpane/host';

afterEach(() => {
  Reflect.deleteProperty(globalThis, 'Office');
  document.body.replaceChildren();
});

const inHost = (host: string): void => {
  Object.assign(globalThis, { Office: { context: { host, platform: 'PC' } } });
};

test('outside of Office there is no host', () => expect(hostName()).toBeNull());

test('Excel is named as a person would', () => {
  inHost('Excel');
  expect(hostName()).toBe('Excel');
});

test('another host is none of ours', () => {
  inHost('Word');
  expect(hostName()).toBeNull();
});

test('a notice shows its words as words, with a button that has a name and closes it', () => {
  notice('these cells are not empty: <b>C3</b>');
  const banner = document.querySelector('[role=alert]')!;
  expect(banner.textContent).toContain('these cells are not empty: <b>C3</b>');
  const close = banner.querySelector<HTMLButtonElement>('button[aria-label]')!;
  close.click();
  expect(document.querySelector('[role=alert]')).toBeNull();
});
