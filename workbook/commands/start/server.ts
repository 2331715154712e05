/** Serves the workbook page and the help pages, and nothing else, to this machine. */
import { createServer, type Server } from 'node:http';
import { helpFolder } from '../../../functions/help/pageName';
import { filesOf } from './folder';

/**
 * Nothing from, and nothing to, any other address. The grid sets styles on its elements and draws
 * pictures from data addresses; it runs no script but ours.
 */
const policy = [
  "default-src 'self'",
  "style-src 'self' 'unsafe-inline'",
  "img-src 'self' data: blob:",
  "font-src 'self' data:",
  "object-src 'none'",
  "base-uri 'none'",
  "form-action 'none'",
  "frame-ancestors 'none'",
].join('; ');

const headers = {
  'Content-Security-Policy': policy,
  'X-Content-Type-Options': 'nosniff',
  'Referrer-Policy': 'no-referrer',
  'Cross-Origin-Opener-Policy': 'same-origin',
  'Cross-Origin-Resource-Policy': 'same-origin',
  'Cache-Control': 'no-cache', // asked for each time, since the page may have been built anew
};

export const pageServer = (folder: string): Server => createServer(filesOf(folder, () => headers, help()));

/** Loaded and made at the first question, since the page should not wait for it. */
function help(): (name: string) => Promise<string | undefined> {
  let files: Promise<ReadonlyMap<string, string>> | undefined;
  return async (name) => {
    if (!name.startsWith(`${helpFolder}/`)) return undefined;
    files ??= made();
    return (await files).get(name.slice(helpFolder.length + 1));
  };
}

async function made(): Promise<ReadonlyMap<string, string>> {
  const [{ catalogue }, { helpFiles }] = await Promise.all([
    import('../../../functions/catalogue'),
    import('../../../functions/help/files'),
  ]);
  return helpFiles(catalogue);
}
