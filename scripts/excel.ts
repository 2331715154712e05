/**
 * Offers the add-in to Excel on this machine alone, as it would be packaged: `npm run excel [-- --port N]`.
 * Ctrl+C ends it.
 */
import { readFileSync, rmSync } from 'node:fs';
import { createServer } from 'node:https';
import path from 'node:path';
import { trustedCertificate } from './excel/certificate';
import { packagedFiles } from './package/files';
import { packageListener } from './package/serve';
import { versionAt } from './package/version';
import { writeFiles } from './package/write';

const usage = `npm run excel [-- --port N]
Serves the add-in at https://localhost:3000, or another port, for Excel on this machine.
`;

const folder = path.join('.cache', 'excel');

/** Programs ask for localhost by either. */
const loopbacks = ['127.0.0.1', '::1'];

async function main(words: readonly string[]): Promise<void> {
  if (words.includes('--help') || words.includes('-h')) return void console.log(usage);
  const address = `https://localhost:${portIn(words)}`;
  const certificate = trustedCertificate();
  const { version } = JSON.parse(readFileSync('package.json', 'utf8')) as { version: string };
  const manifest = readFileSync('manifest.xml', 'utf8');
  rmSync(folder, { recursive: true, force: true });
  writeFiles(
    folder,
    packagedFiles(path.join('dist', 'addin'), manifest, address, versionAt(version, new Date())),
  );
  const servers = loopbacks.map(() => createServer({ ...certificate }, packageListener(folder)));
  const outcomes = await Promise.allSettled(
    servers.map(
      (server, place) =>
        new Promise<void>((resolve, reject) => {
          server.once('error', reject);
          server.listen(Number(new URL(address).port), loopbacks[place], resolve);
        }),
    ),
  );
  if (outcomes[0].status === 'rejected') {
    servers.forEach((server) => server.close());
    throw new Error(`${address} cannot be served: ${(outcomes[0].reason as Error).message}`);
  }
  console.log(`Flaskpace: ${address} (Ctrl+C ends it)`);
  console.log(`Load ${path.resolve(folder, 'manifest.xml')} in Excel; docs/excel.md tells how.`);
  const end = (): void =>
    servers.forEach((server) => {
      server.close();
      server.closeAllConnections();
    });
  process.once('SIGINT', end);
  process.once('SIGTERM', end);
}

function portIn(words: readonly string[]): number {
  if (words.length === 0) return 3000;
  const [, typed] = /^--port[= ](\d+)$/.exec(words.join(' ')) ?? [];
  const port = Number(typed);
  if (port >= 1 && port <= 65535) return port;
  throw new Error(`--port N is known, from 1 to 65535: got "${words.join(' ')}"`);
}

main(process.argv.slice(2)).catch((error: unknown) => {
  console.error(error instanceof Error ? error.message : String(error));
  process.exitCode = 2;
});
