/** The words after `npm run package --`. */
import { requireAddress } from './manifest';
import { requireVersion } from './version';

export interface PackageOptions {
  readonly address: string;
  /** Left out: worked out from the package's version and the hour. */
  readonly version?: string;
  readonly out: string;
}

export const usage = `npm run package -- --url ADDRESS [--version N.N.N.N] OUT_FOLDER
Makes the folder that a web server must offer so that Excel can load the add-in.
  --url ADDRESS       where the folder will stand, such as https://example.org/flaskpace
  --version N.N.N.N   of the manifest (left out: the version of the package, then the hours since 2026 began)
  OUT_FOLDER          a new or an empty folder
`;

/** @throws with what is wrong with the words, in words */
export function readOptions(words: readonly string[]): PackageOptions {
  const given = new Map<string, string>();
  const folders: string[] = [];
  const rest = [...words];
  while (rest.length > 0) {
    const word = rest.shift()!;
    if (!word.startsWith('-')) {
      folders.push(word);
      continue;
    }
    const [name, attached] = word.split(/=(.*)/s, 2);
    if (name !== '--url' && name !== '--version')
      throw new Error(`unknown option "${word}": --url ADDRESS and --version N.N.N.N are known`);
    given.set(name, attached ?? rest.shift() ?? '');
  }
  const address = given.get('--url');
  if (address === undefined) throw new Error('--url ADDRESS is needed: where the folder will stand');
  if (folders.length !== 1) throw new Error(`one OUT_FOLDER is needed: got ${folders.length}`);
  const version = given.get('--version');
  return {
    address: requireAddress(address),
    ...(version === undefined ? {} : { version: requireVersion(version) }),
    out: folders[0],
  };
}
