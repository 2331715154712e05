/** `npm start`: shows the local workbook in the browser, from this machine to this machine alone. */
import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { openInBrowser } from './start/browser';
import { readOptions, usage, type StartOptions } from './start/options';
import { pageServer } from './start/server';
import { listen } from './start/listen';

const exitCode = { notDone: 2 };

function refuse(words: string): void {
  process.stderr.write(`${words}\n`);
  process.exitCode = exitCode.notDone;
}

async function start({ port, open, folder }: StartOptions): Promise<void> {
  if (!existsSync(join(folder, 'index.html')))
    return refuse(`the page is not built: ${folder} holds no index.html`);
  const server = pageServer(folder);
  const taken = await listen(server, port);
  if (typeof taken === 'string') return refuse(taken);
  const address = `http://127.0.0.1:${taken}/`;
  process.stdout.write(`Flaskpace: ${address} (Ctrl+C ends it)\n`);
  const end = (): void => {
    server.close();
    server.closeAllConnections();
  };
  process.once('SIGINT', end);
  process.once('SIGTERM', end);
  if (open) openInBrowser(address);
}

const options = readOptions(process.argv.slice(2), join(__dirname, '..', 'workbook'));
if (options === 'help') process.stdout.write(usage);
else if (typeof options === 'string') refuse(options);
else void start(options).catch((error: Error) => refuse(`the page could not be served: ${error.message}`));
