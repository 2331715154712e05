/** The search over all pages: its words are built in, so that it needs no network and works from a folder too. */
import { byMeasurement, byQuestion, type Way } from './ways';

export interface SearchedPage {
  readonly to: string;
  readonly title: string;
  readonly summary: string;
  readonly words: string;
}

const entities: Readonly<Record<string, string>> = { amp: '&', lt: '<', gt: '>', quot: '"' };

/** A page as it is searched: each of its words once. @param more words that lead there */
export function searched(
  to: string,
  html: string,
  { title, summary, more = '' }: { title: string; summary: string; more?: string },
): SearchedPage {
  const text = html
    .replace(/<nav[\s\S]*?<\/nav>|<math[\s\S]*?<\/math>|<head>[\s\S]*?<\/head>|<[^>]+>/g, ' ')
    .replace(/&(amp|lt|gt|quot);/g, (_, name: string) => entities[name]);
  const words = new Set(`${text} ${more}`.toLowerCase().match(/[\p{L}\p{N}%‡]{2,}/gu));
  return { to, title, summary, words: [...words].sort().join(' ') };
}

/** The words of the ways that lead to a function. */
export const waysTo = (name: string): string =>
  [...byMeasurement, ...byQuestion]
    .filter(({ functions }: Way) => functions.includes(name))
    .map(({ from }) => from)
    .join(' ');

export const searchScript = (pages: readonly SearchedPage[]): string =>
  `const pages = ${JSON.stringify(pages)};\n${script}`;

/** A page is found when it holds every word typed; its name counts most, then its summary. */
const script = `const plain = (words) => words.toLowerCase().replace(/\\blives\\b/g, 'life').replace(/^=/, '');
const box = document.getElementById('look-for');
const list = document.getElementById('found');
const count = document.getElementById('found-count');
const ways = document.getElementById('ways');
const linkTo = ({ to, title, summary }) => {
  const item = document.createElement('li');
  const link = document.createElement('a');
  link.href = to;
  link.textContent = title;
  item.append(link, ' ' + summary);
  return item;
};
const look = () => {
  const wanted = plain(box.value).split(/\\s+/).filter(Boolean);
  const bears = (words) => wanted.every((word) => plain(words).includes(word));
  const rank = ({ title, summary, words }) =>
    bears(title) ? 0 : bears(title + ' ' + summary) ? 1 : bears(title + ' ' + summary + ' ' + words) ? 2 : 3;
  const found = wanted.length === 0 ? [] : pages.filter((page) => rank(page) < 3).sort((a, b) => rank(a) - rank(b));
  list.replaceChildren(...found.map(linkTo));
  list.hidden = found.length === 0;
  ways.hidden = wanted.length > 0;
  count.textContent =
    wanted.length === 0 ? '' : found.length === 0 ? 'No page speaks of that: try another word.' : found.length === 1 ? 'One page' : found.length + ' pages';
};
box.addEventListener('input', look);
document.addEventListener('keydown', (event) => {
  if (event.key === '/' && document.activeElement !== box) { event.preventDefault(); box.focus(); }
  if (event.key === 'Escape' && document.activeElement === box) { box.value = ''; look(); }
  if (event.key === 'Enter' && document.activeElement === box) list.querySelector('a')?.click();
});
box.value = new URLSearchParams(location.search).get('for') ?? box.value;
look();
`;
