/** The manifest for wherever the add-in will stand. */

/** The address in the checked-in manifest, for trying out on one's own machine. */
export const ownMachine = 'https://localhost:3000';

/** What the checked-in manifest calls the script, whose built name changes with its content. */
const plainScript = 'addin.js';

export interface Placed {
  /** The folder on the web, as `requireAddress` answers it. */
  readonly address: string;
  /** Four numbers. */
  readonly version: string;
  /** The built script, from that folder on. */
  readonly script: string;
}

/** Excel loads an add-in over HTTPS alone. @throws with the rule in words */
export function requireAddress(text: string): string {
  const url = URL.canParse(text) ? new URL(text) : undefined;
  if (url?.protocol !== 'https:' || url.search !== '' || url.hash !== '') {
    throw new Error(`the address must be https:// and no more than a folder: got "${text}"`);
  }
  return url.href.replace(/\/+$/, '');
}

/** The manifest with every address of ours moved, in its new version. */
export const manifestFor = (manifest: string, { address, version, script }: Placed): string =>
  manifest
    .replace(`${ownMachine}/${plainScript}`, `${ownMachine}/${script}`)
    .replaceAll(ownMachine, address)
    .replace(/<Version>[^<]*<\/Version>/, `<Version>${version}</Version>`);

/** The files that a manifest has Excel load, from the folder on. */
export function filesNamed(manifest: string, address: string): string[] {
  const addresses = [...manifest.matchAll(/DefaultValue="([^"]*)"/g)].map(([, value]) => value);
  const ours = addresses.filter((value) => value.startsWith(`${address}/`));
  return [...new Set(ours.map((value) => value.slice(address.length + 1)))];
}
