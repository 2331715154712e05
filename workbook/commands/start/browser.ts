/** Opens an address in the browser the person has chosen as theirs. */
import { spawn } from 'node:child_process';

/** How each system is asked. Windows' own opener needs no shell, so nothing in the address is read as a command. */
const openers: Readonly<Partial<Record<NodeJS.Platform, readonly [string, ...string[]]>>> = {
  darwin: ['open'],
  win32: ['rundll32', 'url.dll,FileProtocolHandler'],
};

/** Never fails: without a browser or a display the printed address is all there is. */
export function openInBrowser(address: string): void {
  const [program, ...words] = openers[process.platform] ?? ['xdg-open'];
  try {
    const opener = spawn(program, [...words, address], { stdio: 'ignore', detached: true });
    opener.on('error', () => {});
    opener.unref();
  } catch {
    // the address has been printed
  }
}
