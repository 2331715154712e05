/** @jest-environment jsdom */
import { h } from '../../taskpane/h';
import { drawn, later } from '../../taskpane/later';
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

describe('what is put off', () => {
  const list = (words: string, on: unknown, draw = jest.fn(() => [h('li', {}, words)])) => ({
    draw,
    view: () => h('div', {}, later(h('ul'), [on], draw)),
  });

  test('is drawn with the page, again where it rests on something else, and not otherwise', () => {
    const [first, same, other] = [list('one', 1), list('unseen', 1), list('two', 2)];
    const current = drawn(first.view());
    expect(current.textContent).toBe('one');
    patch(current, same.view());
    expect([current.textContent, same.draw.mock.calls.length]).toEqual(['one', 0]);
    patch(current, other.view());
    expect(current.textContent).toBe('two');
    patch(current, list('unseen', 2).view());
    expect(current.textContent).toBe('two');
  });

  test('is drawn where it comes new to the page, and where something else stood in its place', () => {
    const current = h('main', {}, h('ul', {}, h('li', {}, 'plain')));
    patch(
      current,
      h(
        'main',
        {},
        later(h('ul'), [1], () => [h('li', {}, 'put off')]),
        list('added', 1).view(),
      ),
    );
    expect(current.textContent).toBe('put offadded');
    patch(current, h('main', {}, h('ul', {}, h('li', {}, 'plain'))));
    patch(
      current,
      h(
        'main',
        {},
        later(h('ul'), [1], () => [h('li', {}, 'again')]),
      ),
    );
    expect(current.textContent).toBe('again');
  });

  test('is drawn below what was put off itself', () => {
    const inner = (): HTMLElement => later(h('b'), [1], () => ['inner']);
    const current = drawn(later(h('div'), [1], () => [h('p', {}, inner())]));
    expect(current.textContent).toBe('inner');
  });
});
