/** The command that serves the page: to this machine alone, on a free port, with words for what goes wrong. */
import { spawnSync } from 'node:child_process';
import { request } from 'node:http';
import { startCommand, startServer, type PageBench } from '../bench';

export function startSuite(bench: () => PageBench): void {
  const run = (...words: readonly string[]): { code: number | null; said: string } => {
    const { status, stdout, stderr } = spawnSync(process.execPath, [startCommand, ...words], {
      encoding: 'utf8',
      timeout: 10_000,
    });
    return { code: status, said: stdout + stderr };
  };
  /** As it stands: a browser or fetch would tidy the path and the host first. */
  const status = (path: string, host?: string): Promise<number | undefined> =>
    new Promise((resolve, reject) => {
      const { hostname, port, host: own } = new URL(bench().address);
      request({ hostname, port, path, headers: { host: host ?? own } }, (answer) => {
        answer.resume();
        resolve(answer.statusCode);
      })
        .on('error', reject)
        .end();
    });

  test('what is asked for beside the page is not there', async () => {
    expect(await status('/')).toBe(200);
    expect(await status('/workbook.js?now')).toBe(200);
    for (const path of [
      '/../commands/start.cjs',
      '/..%2fcommands%2fstart.cjs',
      '/%2e%2e/commands/start.cjs',
      '//etc/passwd',
      '/workbook.js%00',
      '/%zz',
      '/assets',
    ]) {
      expect([path, await status(path)]).toEqual([path, 404]);
    }
  });

  test('a page of another name that leads to this machine cannot read it', async () => {
    expect(await status('/', 'example.org')).toBe(421);
  });

  test('the browser is told to load nothing from elsewhere, and to ask again each time', async () => {
    const first = await fetch(bench().address);
    expect(first.headers.get('content-security-policy')).toContain("default-src 'self'");
    expect(first.headers.get('content-type')).toBe('text/html; charset=utf-8');
    expect(first.headers.get('cache-control')).toBe('no-cache');
    const again = await fetch(bench().address, {
      headers: { 'if-none-match': first.headers.get('etag')! },
    });
    expect(again.status).toBe(304);
    expect((await fetch(bench().address, { method: 'POST' })).status).toBe(405);
  });

  test('a port that was asked for and is in use is refused in one line', () => {
    const { port } = new URL(bench().address);
    expect(run('--no-open', '--port', port)).toEqual({
      code: 2,
      said: `port ${port} is in use: name another, or leave --port out\n`,
    });
  });

  test('without a port asked for, a second start takes the next free one', async () => {
    const servers = [await startServer('--no-open'), await startServer('--no-open')];
    const ports = servers.map(({ address }) => Number(new URL(address).port));
    servers.forEach(({ server }) => server.kill());
    expect(ports[0]).toBeGreaterThanOrEqual(8642);
    expect(ports[1]).toBeGreaterThan(ports[0]);
  });

  test('words it does not know are named', () => {
    expect(run('--prot', '80')).toEqual({
      code: 2,
      said: 'unknown option "--prot": --port N and --no-open are known\n',
    });
    expect(run('--port', 'eighty').said).toBe(
      '--port must be a whole number from 0 to 65535: got "eighty"\n',
    );
    expect(run('--help')).toMatchObject({ code: 0, said: expect.stringContaining('--no-open') });
  });
}
