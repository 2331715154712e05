/**
 * The certificate for https://localhost that Excel on this machine trusts. Microsoft's office-addin-dev-certs makes
 * it, puts its maker among those the system trusts (which the system asks about) and keeps it for 30 days.
 */
import { spawnSync } from 'node:child_process';
import { X509Certificate } from 'node:crypto';
import { readFileSync } from 'node:fs';
import { homedir } from 'node:os';
import path from 'node:path';

export interface Certificate {
  readonly cert: string;
  readonly key: string;
}

/** Not among the packages of the project, since nothing but this needs it. */
const maker = 'office-addin-dev-certs@3.0.0';

/** Where the maker keeps it. */
export const certificateFolder = (): string => path.join(homedir(), '.office-addin-dev-certs');

/** @returns nothing where there is none or it has run out */
export function certificateIn(folder: string, now: Date): Certificate | undefined {
  try {
    const [cert, key] = ['localhost.crt', 'localhost.key'].map((name) =>
      readFileSync(path.join(folder, name), 'utf8'),
    );
    return new Date(new X509Certificate(cert).validTo) > now ? { cert, key } : undefined;
  } catch {
    return undefined;
  }
}

/** Has one made where there is none. @throws with what to do, in words */
export function trustedCertificate(): Certificate {
  const folder = certificateFolder();
  const there = certificateIn(folder, new Date());
  if (there) return there;
  console.log(
    `a certificate for https://localhost is made by ${maker}; your system asks whether to trust it`,
  );
  // Windows finds npx by way of its shell alone
  spawnSync('npx', ['--yes', maker, 'install'], { stdio: 'inherit', shell: process.platform === 'win32' });
  const made = certificateIn(folder, new Date());
  if (made) return made;
  throw new Error(`there is no certificate in ${folder}: run "npx ${maker} install", which says why`);
}
