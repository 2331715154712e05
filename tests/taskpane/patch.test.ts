/** @jest-environment jsdom */
import { h } from '../../taskpane/h';
import { patch } from '../../taskpane/patch';

test('patch brings words, attributes and children up to date', () => {
  const current = h('div', { className: 'old', title: 'gone' }, h('p', {}, 'one'), h('p', {}, 'two'), 'tail');
  patch(
    current,
    h('div', { className: 'new' }, h('p', { lang: 'en' }, 'three'), h('ul', {}, h('li', {}, 'four'))),
  );
  expect(current.outerHTML).toBe('<div class="new"><p lang="en">three</p><ul><li>four</li></ul></div>');
});

test('elements that stay are the same elements, those with another id are not', () => {
  const current = h('div', {}, h('input', { id: 'a' }), h('input', { id: 'b' }));
  const [a, b] = current.children;
  patch(current, h('div', {}, h('input', { id: 'a', value: 'x' }), h('input', { id: 'c' })));
  expect(current.children[0]).toBe(a);
  expect((a as HTMLInputElement).value).toBe('x');
  expect(current.children[1]).not.toBe(b);
});

test('the newest handler answers', () => {
  const [old, fresh] = [jest.fn(), jest.fn()];
  const current = h('div', {}, h('button', { onclick: old }));
  patch(current, h('div', {}, h('button', { onclick: fresh })));
  current.querySelector('button')!.click();
  expect([old.mock.calls.length, fresh.mock.calls.length]).toEqual([0, 1]);
});

test('a select shows its choice, also when the options have changed', () => {
  const select = (chosen: string, ...values: string[]): HTMLElement =>
    h(
      'div',
      {},
      h(
        'select',
        { 'data-chosen': chosen },
        ...values.map((value) => h('option', { value, selected: value === chosen })),
      ),
    );
  const current = select('a', 'a', 'b');
  patch(current, select('c', 'b', 'c'));
  expect(current.querySelector('select')!.value).toBe('c');
});

test('what a person opened stays open, and a view can open it', () => {
  const current = h('div', {}, h('details', { open: true }), h('details', {}));
  patch(current, h('div', {}, h('details', {}), h('details', { open: true })));
  expect([...current.querySelectorAll('details')].map(({ open }) => open)).toEqual([true, true]);
});
