/** The browser that the page is tested in: the one on this machine. */
import { execFileSync } from 'node:child_process';
import { accessSync, constants, existsSync, readFileSync } from 'node:fs';
import { delimiter, join } from 'node:path';
import { chromium, type Browser } from 'playwright-core';

/** Names a browser of your choice, by its full path. */
const ownChoice = 'FLASKPACE_BROWSER';

const namesOnPath: readonly string[] = [
  'google-chrome',
  'google-chrome-stable',
  'chromium',
  'chromium-browser',
  'microsoft-edge',
  'microsoft-edge-stable',
];

const windowsFolders = ['PROGRAMFILES', 'PROGRAMFILES(X86)', 'LOCALAPPDATA'];

function knownPlaces(): string[] {
  if (process.platform === 'darwin') {
    return [
      '/Applications/Google Chrome.app/Contents/MacOS/Google Chrome',
      '/Applications/Microsoft Edge.app/Contents/MacOS/Microsoft Edge',
      '/Applications/Chromium.app/Contents/MacOS/Chromium',
    ];
  }
  if (process.platform === 'win32') {
    const folders = windowsFolders.flatMap((name) => process.env[name] ?? []);
    return folders.flatMap((folder) => [
      join(folder, 'Google', 'Chrome', 'Application', 'chrome.exe'),
      join(folder, 'Microsoft', 'Edge', 'Application', 'msedge.exe'),
      join(folder, 'Chromium', 'Application', 'chrome.exe'),
    ]);
  }
  const folders = (process.env.PATH ?? '').split(delimiter);
  return [
    ...namesOnPath.flatMap((name) => folders.map((folder) => join(folder, name))),
    '/opt/google/chrome/chrome',
    '/snap/bin/chromium',
  ];
}

function isRunnable(path: string): boolean {
  try {
    accessSync(path, constants.X_OK);
    return true;
  } catch {
    return false;
  }
}

/** @throws with one line that says what to install */
export function browserPath(): string {
  const own = process.env[ownChoice];
  if (own) {
    if (isRunnable(own)) return own;
    throw new Error(`${ownChoice} must name a browser that can be run: got "${own}"`);
  }
  const find = (): string | undefined => knownPlaces().find(isRunnable);
  const found = find() ?? (installChromium() ? find() : undefined);
  if (found) return found;
  throw new Error(
    `the page is tested in Chrome, Edge or Chromium, and none was found: install one, or name it in ${ownChoice}`,
  );
}

/** On a bare Debian or Ubuntu with the rights to. @returns whether it did */
function installChromium(): boolean {
  const isRoot = process.getuid?.() === 0;
  const isDebian = existsSync('/etc/debian_version') && existsSync('/usr/bin/apt-get');
  if (!isRoot || !isDebian) return false;
  // Ubuntu's package only points to a snap, which a container cannot run
  const isUbuntu = /^ID=ubuntu$/m.test(readFileSync('/etc/os-release', 'utf8'));
  const packages = isUbuntu ? ['chromium-browser'] : ['chromium'];
  const apt = (...words: string[]): void => {
    execFileSync('apt-get', words, {
      stdio: 'ignore',
      env: { ...process.env, DEBIAN_FRONTEND: 'noninteractive' },
    });
  };
  try {
    apt('update');
    apt('install', '--yes', '--no-install-recommends', ...packages);
    return true;
  } catch {
    return false;
  }
}

export function launchBrowser(): Promise<Browser> {
  const isRoot = process.getuid?.() === 0;
  return chromium.launch({
    executablePath: browserPath(),
    // Chromium refuses its sandbox to root, whom containers run as
    args: isRoot ? ['--no-sandbox'] : [],
  });
}
