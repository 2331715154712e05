/** Where help begins: which function answers what. */
import { typedName, type CellFunction } from '../define';
import { byFamily } from '../readmeTable';
import { escaped, page, table } from './html';
import { pageName } from './pageName';
import { byMeasurement, byQuestion, job, type Way } from './ways';

export function indexPage(catalogue: readonly CellFunction[]): string {
  const body = [
    '<h1>Which function do I need?</h1>',
    '<p class="lead">Two columns, time and reading, become the answer that is owed: amount, rate, order, rate coefficient, half life, prediction.</p>',
    '<p class="search"><label for="look-for">Look for a word on all pages</label> <input id="look-for" type="search" autocomplete="off" placeholder="balance, half life, shelf life …" /></p>',
    '<p id="found-count" class="quiet" role="status"></p>',
    '<ul id="found" class="found" hidden=""></ul>',
    '<div id="ways">',
    '<h2>The way of the job</h2>',
    `<ol class="way">\n${job.map(step).join('\n')}\n</ol>`,
    '<h2>What did you measure with?</h2>',
    wayTable(['you have', 'functions, in the order of use'], byMeasurement),
    '<h2>What do you want to know?</h2>',
    wayTable(['question', 'functions'], byQuestion),
    '<h2>All functions</h2>',
    ...byFamily(catalogue).map(
      ([heading, functions]) =>
        `<h3>${heading}</h3>\n<ul class="functions">\n${functions.map(item).join('\n')}\n</ul>`,
    ),
    '</div>',
    '<script src="help.js"></script>',
  ];
  return page('Flaskpace: which function do I need?', body.join('\n'));
}

const step = ({ from, functions, hint }: Way): string =>
  `<li><strong>${from}</strong><span class="quiet">${hint ?? ''}</span>${functions.map((name) => `<a href="${pageName({ name })}">${name}</a>`).join('')}</li>`;

const link = (name: string): string => `<a href="${pageName({ name })}">${typedName({ name })}</a>`;

const wayTable = (headings: readonly string[], ways: readonly Way[]): string =>
  table(
    headings,
    ways.map(({ from, functions, hint }) => [
      escaped(from),
      `${functions.map(link).join(', ')}${hint ? `<br /><span class="quiet">${escaped(hint)}</span>` : ''}`,
    ]),
  );

const item = (f: CellFunction): string =>
  `<li><a href="${pageName(f)}">${typedName(f)}</a> ${escaped(f.summary)}</li>`;
