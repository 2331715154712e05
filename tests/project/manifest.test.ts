import { existsSync, readFileSync } from 'node:fs';
import { OfficeAddinManifest } from 'office-addin-manifest';
import { SaxesParser } from 'saxes';
import { namespace } from '../../functions/define';

const path = 'manifest.xml';
const xml = readFileSync(path, 'utf8');

interface Element {
  readonly name: string;
  readonly attributes: Readonly<Record<string, string>>;
  /** Names of the elements around it, outermost first. */
  readonly within: readonly string[];
}

function elementsOf(text: string): Element[] {
  const elements: Element[] = [];
  const open: string[] = [];
  const parser = new SaxesParser();
  parser.on('opentag', ({ name, attributes }) => {
    elements.push({ name, attributes: attributes as Record<string, string>, within: [...open] });
    open.push(name);
  });
  parser.on('closetag', () => open.pop());
  parser.on('error', (error) => {
    throw error;
  });
  parser.write(text).close();
  return elements;
}

const elements = elementsOf(xml);
const resourceKinds = ['bt:Image', 'bt:Url', 'bt:String'];
const resources = elements.filter(
  ({ name, attributes }) => resourceKinds.includes(name) && attributes.id !== undefined,
);
const uses = elements.filter(({ attributes }) => attributes.resid !== undefined);
const valueOf = (id: string): string =>
  resources.find(({ attributes }) => attributes.id === id)!.attributes.DefaultValue;
const residOf = (name: string, parent?: string): string =>
  uses.find(
    (element) => element.name === name && (!parent || element.within[element.within.length - 1] === parent),
  )!.attributes.resid;

test('the manifest reads as a task pane add-in for workbooks, with our name', async () => {
  const info = await OfficeAddinManifest.readManifestFile(path);
  expect(info).toMatchObject({
    displayName: 'Flaskpace',
    providerName: 'The Flaskpace authors',
    officeAppType: 'TaskPaneApp',
    hosts: ['Workbook'],
    permissions: 'ReadWriteDocument',
    version: expect.stringMatching(/^\d+\.\d+\.\d+\.\d+$/),
    id: expect.stringMatching(/^[0-9a-f]{8}-[0-9a-f]{4}-4[0-9a-f]{3}-[89ab][0-9a-f]{3}-[0-9a-f]{12}$/),
  });
});

test('its version is the version of the package', async () => {
  const { version } = JSON.parse(readFileSync('package.json', 'utf8')) as { version: string };
  expect((await OfficeAddinManifest.readManifestFile(path)).version).toBe(`${version}.0`);
});

test('every resource asked for is there, and every one there is asked for', () => {
  const wanted = new Set(uses.map(({ attributes }) => attributes.resid));
  const there = resources.map(({ attributes }) => attributes.id);
  expect([...wanted].sort()).toEqual([...there].sort());
  expect(new Set(there).size).toBe(there.length);
});

test('names and words keep their lengths', () => {
  for (const { name, attributes, within } of resources) {
    expect(attributes.id.length).toBeLessThanOrEqual(32);
    if (name !== 'bt:String') continue;
    const limit = within[within.length - 1] === 'bt:ShortStrings' ? 125 : 250;
    expect(attributes.DefaultValue.length).toBeLessThanOrEqual(limit);
  }
  const textOf = (name: string): string =>
    elements.find((element) => element.name === name)!.attributes.DefaultValue;
  expect(textOf('DisplayName').length).toBeLessThanOrEqual(125);
  expect(textOf('Description').length).toBeLessThanOrEqual(250);
});

test('pane, functions and commands share one runtime', () => {
  const shared = residOf('Runtime');
  expect(residOf('SourceLocation', 'Page')).toBe(shared);
  expect(residOf('FunctionFile')).toBe(shared);
  expect(residOf('SourceLocation', 'Action')).toBe(shared);
  expect(elements.find(({ name }) => name === 'Runtime')!.attributes.lifetime).toBe('long');
  expect(valueOf(shared)).toBe(
    elements.find((e) => e.name === 'SourceLocation' && e.attributes.DefaultValue)!.attributes.DefaultValue,
  );
});

test('the namespace is the one that formulas are typed with', () => {
  expect(valueOf(residOf('Namespace'))).toBe(namespace);
  expect(namespace).toMatch(/^[A-Za-z][A-Za-z0-9._]{0,31}$/);
});

/** Width and height from the header chunk (ISO/IEC 15948, 11.2.2). */
function pngSize(file: string): [number, number] {
  const bytes = readFileSync(file);
  expect(bytes.subarray(0, 8).toString('hex')).toBe('89504e470d0a1a0a');
  expect(bytes.subarray(12, 16).toString('latin1')).toBe('IHDR');
  return [bytes.readUInt32BE(16), bytes.readUInt32BE(20)];
}

const fileOf = (url: string): string => new URL(url).pathname.slice(1);

test('every icon is a picture of the size it is asked for in', () => {
  const images = elements.filter(({ name, attributes }) => name === 'bt:Image' && attributes.size);
  expect(new Set(images.map(({ attributes }) => attributes.size))).toEqual(new Set(['16', '32', '80']));
  for (const { attributes } of images) {
    expect(pngSize(fileOf(valueOf(attributes.resid)))).toEqual([
      Number(attributes.size),
      Number(attributes.size),
    ]);
  }
  const urlOf = (name: string): string =>
    elements.find((element) => element.name === name)!.attributes.DefaultValue;
  expect(pngSize(fileOf(urlOf('IconUrl')))).toEqual([32, 32]);
  expect(pngSize(fileOf(urlOf('HighResolutionIconUrl')))).toEqual([64, 64]);
});

test('every address is https, on one host, and leads to a file that the build makes', () => {
  const addresses = elements
    .flatMap(({ attributes }) => Object.values(attributes))
    .filter((value) => /^https:\/\/localhost/.test(value));
  expect(addresses.length).toBeGreaterThan(5);
  const built = ['taskpane.html', 'addin.js', 'functions.json', 'help/index.html'];
  for (const address of addresses) {
    const file = fileOf(address);
    expect(new URL(address).origin).toBe('https://localhost:3000');
    expect(built.includes(file) || existsSync(file)).toBe(true);
  }
  expect(xml).not.toMatch(/"http:\/\/localhost/);
});
