/** The manifest for wherever the add-in will stand. */

/** The address in the checked-in manifest, for trying out on one's own machine. */
const ownMachine = 'https://localhost:3000';

/** Excel loads an add-in over HTTPS alone. @throws with the rule in words */
export function requireAddress(text: string): string {
  const url = URL.canParse(text) ? new URL(text) : undefined;
  if (url?.protocol !== 'https:' || url.search !== '' || url.hash !== '') {
    throw new Error(`the address must be https:// and no more than a folder: got "${text}"`);
  }
  return url.href.replace(/\/+$/, '');
}

/** The manifest with every address of ours moved. */
export const manifestFor = (manifest: string, address: string): string =>
  manifest.replaceAll(ownMachine, requireAddress(address));
