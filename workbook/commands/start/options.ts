/** The words after `npm start --`. */
export interface StartOptions {
  /** A port that was asked for by number, or `null`: the first free one of our own. */
  readonly port: number | null;
  readonly open: boolean;
  /** The built page. */
  readonly folder: string;
}

export const usage = `npm start -- [--port N] [--no-open]
Shows the workbook page in the browser. It is served from this machine to this machine alone.
  --port N    this port and no other (left out: the first free one from 8642)
  --no-open   print the address, open no browser
`;

/** @returns the options, `'help'`, or what is wrong with the words, in words */
export function readOptions(words: readonly string[], folder: string): StartOptions | 'help' | string {
  let port: number | null = null;
  let open = true;
  const rest = [...words];
  while (rest.length > 0) {
    const word = rest.shift()!;
    const [name, attached] = word.split('=', 2);
    if (name === '--help' || name === '-h') return 'help';
    else if (name === '--no-open' && attached === undefined) open = false;
    else if (name === '--port') {
      const typed = attached ?? rest.shift() ?? '';
      port = Number(typed);
      if (!/^\d+$/.test(typed) || port > 65535) {
        return `--port must be a whole number from 0 to 65535: got "${typed}"`;
      }
    } else return `unknown option "${word}": --port N and --no-open are known`;
  }
  return { port, open, folder };
}
