/** `npm run excel` with a certificate of the test's own: no system is asked to trust anything. */
import { execFileSync, spawn, spawnSync } from 'node:child_process';
import { mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { request } from 'node:https';
import { createServer, type AddressInfo } from 'node:net';
import path from 'node:path';
import { certificateIn } from '../../../scripts/excel/certificate';
import { command, temporaryFolder } from './command';

const home = temporaryFolder();
const certificates = home.path('.office-addin-dev-certs');
const crt = path.join(certificates, 'localhost.crt');
const bundle = path.join('dist', 'commands', 'excel.cjs');
const hasOpenssl = spawnSync('openssl', ['version']).status === 0;
const withOpenssl = hasOpenssl ? test : test.skip;

beforeAll(() => {
  execFileSync(process.execPath, ['scripts/run.mjs', 'build'], { stdio: 'pipe' });
  mkdirSync(certificates);
  if (!hasOpenssl) return;
  const key = path.join(certificates, 'localhost.key');
  const subject = ['-subj', '/CN=localhost', '-addext', 'subjectAltName=DNS:localhost'];
  const made = ['req', '-x509', '-newkey', 'rsa:2048', '-nodes', '-days', '2', '-keyout', key, '-out', crt];
  execFileSync('openssl', [...made, ...subject], { stdio: 'pipe' });
}, 240_000);
afterAll(() => home.remove());

interface Answered {
  readonly status: number | undefined;
  readonly policy: unknown;
  readonly text: string;
}

/** As Excel would: the certificate must be one that is trusted, for this name. */
const get = (url: string): Promise<Answered> =>
  new Promise((resolve, reject) => {
    const asked = request(url, { ca: readFileSync(crt) }, (response) => {
      let text = '';
      response.on('data', (part: Buffer) => (text += String(part)));
      response.on('end', () =>
        resolve({ status: response.statusCode, policy: response.headers['content-security-policy'], text }),
      );
    });
    asked.on('error', reject).end();
  });

async function freePort(): Promise<number> {
  const server = createServer();
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  const { port } = server.address() as AddressInfo;
  await new Promise((resolve) => server.close(resolve));
  return port;
}

withOpenssl('the packaged add-in is served over HTTPS, and the manifest points there', async () => {
  const port = await freePort();
  const address = `https://localhost:${port}`;
  const env = { ...process.env, HOME: home.path(''), USERPROFILE: home.path('') };
  const served = spawn(process.execPath, [bundle, '--port', String(port)], { env });
  let said = '';
  await new Promise<void>((resolve, reject) => {
    served.stdout.on(
      'data',
      (words: Buffer) => (said += String(words)).includes('docs/excel.md') && resolve(),
    );
    served.stderr.on('data', (words: Buffer) => reject(new Error(String(words))));
  });
  expect(said).toContain(`Flaskpace: ${address}`);
  const manifest = await get(`${address}/manifest.xml`);
  for (const [, url] of manifest.text.matchAll(/DefaultValue="(https:[^"]+)"/g)) {
    expect(url.startsWith(`${address}/`)).toBe(true);
    const { status, policy } = await get(url);
    expect([status, policy]).toEqual([200, expect.stringContaining('appsforoffice.microsoft.com')]);
  }
  const ended = new Promise((resolve) => served.on('exit', resolve));
  served.kill('SIGTERM');
  await ended;
});

withOpenssl('a certificate counts until it runs out', () => {
  const day = 86_400_000;
  expect(certificateIn(certificates, new Date())?.cert).toContain('BEGIN CERTIFICATE');
  expect(certificateIn(certificates, new Date(Date.now() + 3 * day))).toBeUndefined();
});

test('a certificate that is missing or none counts as none', () => {
  expect(certificateIn(home.path('nowhere'), new Date())).toBeUndefined();
  const other = home.path('other');
  mkdirSync(other);
  writeFileSync(path.join(other, 'localhost.crt'), 'no certificate');
  writeFileSync(path.join(other, 'localhost.key'), 'no key');
  expect(certificateIn(other, new Date())).toBeUndefined();
});

test('a port that is none is refused', () =>
  expect(command('excel', '--port', 'x')).toMatchObject({
    code: 2,
    err: '--port N is known, from 1 to 65535: got "--port x"\n',
  }));
