/** The files of one folder, and nothing else, for this machine. */
import { createReadStream, readdirSync, statSync } from 'node:fs';
import type { IncomingMessage, RequestListener, ServerResponse } from 'node:http';
import { extname, join } from 'node:path';

const types: Readonly<Record<string, string>> = {
  '.html': 'text/html; charset=utf-8',
  '.js': 'text/javascript; charset=utf-8',
  '.css': 'text/css; charset=utf-8',
  '.json': 'application/json',
  '.png': 'image/png',
  '.svg': 'image/svg+xml',
  '.woff': 'font/woff',
  '.woff2': 'font/woff2',
  '.ttf': 'font/ttf',
};

const typeOf = (name: string): string => types[extname(name)] ?? 'application/octet-stream';

type Headers = Readonly<Record<string, string>>;

/**
 * @param headersOf what goes along with a file, by its path from the folder on; with what is refused, by ''
 * @param made a text that is made when it is asked for, by the same; nothing for all else
 */
export function filesOf(
  folder: string,
  headersOf: (name: string) => Headers,
  made: Offer['made'] = () => Promise.resolve(undefined),
): RequestListener {
  // what is not on this list is not served: no path is ever taken from a request
  const files = filesBelow(folder);
  return (request, response) => answer(request, response, { folder, files, headersOf, made });
}

interface Offer {
  readonly folder: string;
  readonly files: ReadonlySet<string>;
  headersOf(name: string): Headers;
  made(name: string): Promise<string | undefined>;
}

function answer(
  request: IncomingMessage,
  response: ServerResponse,
  { folder, files, headersOf, made }: Offer,
): void {
  const refuse = (status: number, words: string): void => refused(response, status, words, headersOf(''));
  if (!isOurs(request.headers.host)) return refuse(421, 'this address is not served here');
  if (request.method !== 'GET' && request.method !== 'HEAD') {
    response.setHeader('Allow', 'GET, HEAD');
    return refuse(405, 'only reading is served here');
  }
  const name = fileAsked(request.url ?? '/');
  if (name === null) return refuse(404, 'there is no such file');
  if (!files.has(name)) {
    const answered = (text: string | undefined): void => {
      if (text === undefined) return refuse(404, 'there is no such file');
      response.writeHead(200, { ...headersOf(name), 'Content-Type': typeOf(name) });
      response.end(request.method === 'HEAD' ? undefined : text);
    };
    made(name).then(answered, () => response.destroy());
    return;
  }
  const tag = tagOf(join(folder, name));
  if (tag === null) return refuse(404, 'there is no such file');
  if (request.headers['if-none-match'] === tag) {
    response.writeHead(304, { ...headersOf(name), ETag: tag });
    response.end();
    return;
  }
  response.writeHead(200, { ...headersOf(name), ETag: tag, 'Content-Type': typeOf(name) });
  if (request.method === 'HEAD') {
    response.end();
    return;
  }
  const stream = createReadStream(join(folder, name));
  stream.on('error', () => response.destroy()); // built anew under our feet
  stream.pipe(response);
}

/** Changes with the file; the browser keeps what it has compiled as long as it stays. */
function tagOf(path: string): string | null {
  try {
    const { mtimeMs, size } = statSync(path);
    return `"${mtimeMs.toString(36)}-${size.toString(36)}"`;
  } catch {
    return null; // being built anew
  }
}

function refused(response: ServerResponse, status: number, words: string, headers: Headers): void {
  response.writeHead(status, { ...headers, 'Content-Type': 'text/plain; charset=utf-8' });
  response.end(`${words}\n`);
}

/** Another name that resolves to this machine could belong to a foreign page that reads ours. */
function isOurs(host: string | undefined): boolean {
  return /^(127\.0\.0\.1|localhost)(:\d+)?$/.test(host ?? '');
}

function fileAsked(url: string): string | null {
  try {
    const path = decodeURIComponent(url.split(/[?#]/, 1)[0]);
    return path === '/' ? 'index.html' : path.replace(/^\//, '');
  } catch {
    return null; // a broken escape
  }
}

/** Paths from the folder on, with `/` between on every system. */
function filesBelow(folder: string, under = ''): ReadonlySet<string> {
  const found = new Set<string>();
  for (const entry of readdirSync(join(folder, under), { withFileTypes: true })) {
    const path = under === '' ? entry.name : `${under}/${entry.name}`;
    if (entry.isDirectory()) for (const inner of filesBelow(folder, path)) found.add(inner);
    else if (entry.isFile()) found.add(path);
  }
  return found;
}
