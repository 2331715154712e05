/** @jest-environment jsdom */
import type { Underway } from '../../functions/longWork';
import { longWorkBar } from '../../taskpane/longWorkBar';

let stopped = 0;
const underway = (doing?: string, share?: number): Underway => ({
  name: 'PACE.SURVEY',
  waiting: 1,
  ...(doing !== undefined && { progress: { doing, ...(share !== undefined && { share }) } }),
  stop: () => stopped++,
});

let place: HTMLElement;
let tell: (underway: Underway | null) => void;

beforeEach(() => {
  jest.useFakeTimers();
  place = document.createElement('div');
  tell = longWorkBar(place);
});
afterEach(() => jest.useRealTimers());

test('what is soon done is not worth a word', () => {
  tell(underway());
  jest.advanceTimersByTime(200);
  tell(null);
  jest.advanceTimersByTime(5000);
  expect(place.textContent).toBe('');
});

test('what takes longer is said with how far it is, and can be stopped', () => {
  tell(underway());
  jest.advanceTimersByTime(300);
  tell(underway('run 24 of 96', 0.24));
  jest.advanceTimersByTime(200); // many short ones after each other are long together
  expect(place.textContent).toContain('calculating PACE.SURVEY, 1 more after it');
  expect(place.textContent).toContain('run 24 of 96');
  const bar = place.querySelector('progress')!;
  expect([bar.value, bar.max, bar.getAttribute('aria-valuenow')]).toEqual([24, 100, '24']);
  expect(bar.getAttribute('aria-valuetext')).toBe('run 24 of 96');
  const button = place.querySelector('button')!;
  button.focus();
  tell(underway('run 48 of 96', 0.5));
  expect(place.querySelector('progress')!.value).toBe(50);
  expect(place.querySelector('button')).toBe(button); // the keyboard keeps its place
  button.click();
  expect(stopped).toBe(1);
  tell(null);
  expect(place.children).toHaveLength(0);
});

test('where nobody can tell how far it is, what is done is said, and no bar stands there', () => {
  tell(underway('searching from the coefficients given'));
  jest.advanceTimersByTime(500);
  expect(place.textContent).toContain('searching from the coefficients given');
  expect(place.querySelector('progress')).toBeNull();
});
