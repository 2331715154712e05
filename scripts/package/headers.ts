/**
 * What a web server should say along with each file, as the folder's own `_headers` file: a format that several
 * hosts of static files read by themselves, and that anyone can read who sets up another server.
 *
 * Microsoft publishes no list of what Office.js needs (github.com/OfficeDev/office-js/issues/1005, open). These
 * are its documented addresses and those that add-in authors report there and in issues 1687, 3342 and, in
 * OfficeDev/office-js-docs-pr, 4911.
 */

/** Built files whose names change with their content, so that they can be kept for ever. */
export const hashedFolder = 'built';

/** Office.js at its two addresses, and the library that it fetches from a third. */
const officeScripts = [
  'https://appsforoffice.microsoft.com',
  'https://officeapis.public.onecdn.static.microsoft',
  'https://ajax.aspnetcdn.com',
];

/** The pages around an add-in in Excel on the web; on Windows and Mac there is none. */
const excelOnTheWeb = [
  'https://*.officeapps.live.com',
  'https://*.cloud.microsoft',
  'https://*.office.com',
  'https://*.sharepoint.com',
  'https://onedrive.live.com',
];

const contentSecurityPolicy = [
  "default-src 'none'",
  `script-src 'self' ${officeScripts.join(' ')}`,
  "worker-src 'self'",
  "style-src 'self' 'unsafe-inline'", // Office.js sets styles in the page
  "img-src 'self' data:",
  "connect-src 'self'", // what Office.js would tell its makers stays here, too
  "base-uri 'none'",
  "form-action 'none'",
  `frame-ancestors 'self' ${excelOnTheWeb.join(' ')}`,
].join('; ');

type Headers = Readonly<Record<string, string>>;

const askEachTime: Headers = { 'Cache-Control': 'no-cache' };

/** By path; `*` stands for the rest. No header comes in two rules for one file, since hosts differ in what they then do. */
const rules: readonly (readonly [string, Headers])[] = [
  [
    '/*',
    {
      'Content-Security-Policy': contentSecurityPolicy,
      'X-Content-Type-Options': 'nosniff',
      'Referrer-Policy': 'no-referrer',
    },
  ],
  [`/${hashedFolder}/*`, { 'Cache-Control': 'public, max-age=31536000, immutable' }],
  ['/taskpane.html', askEachTime],
  // Excel on the web reads it from a page of its own
  ['/functions.json', { ...askEachTime, 'Access-Control-Allow-Origin': '*' }],
  ['/manifest.xml', askEachTime],
  ['/assets/*', askEachTime],
  ['/help/*', askEachTime],
];

/** @param address paths in the file count from the root of its server */
export function headersFile(address: string): string {
  const above = new URL(address).pathname.replace(/\/$/, '');
  return rules
    .map(([path, headers]) =>
      [above + path, ...Object.entries(headers).map(([name, value]) => `  ${name}: ${value}`), ''].join('\n'),
    )
    .join('\n');
}

/** What a `_headers` file says of a path: every rule that fits it. */
export function headersOf(file: string, path: string): Record<string, string> {
  const found: Record<string, string> = {};
  let applies = false;
  for (const line of file.split('\n')) {
    if (/^\S/.test(line)) applies = fits(line.trim(), path);
    const [, name, value] = /^\s+([^:\s]+):\s*(.*)$/.exec(line) ?? [];
    if (applies && name) found[name] = value;
  }
  return found;
}

const fits = (pattern: string, path: string): boolean =>
  pattern.endsWith('*') ? path.startsWith(pattern.slice(0, -1)) : path === pattern;
