import { readFileSync } from 'node:fs';
import { catalogue } from '../../functions/catalogue';
import { functionsMetadata, parameterHelp } from '../../functions/metadata';
import { detail } from '../../functions/commonParameters';
import { number, optional } from '../../functions/parameters';

const metadata = functionsMetadata(catalogue);

test('the checked-in functions.json is what the definitions say', () => {
  expect(JSON.parse(readFileSync('functions/functions.json', 'utf8'))).toEqual(metadata);
});

test('every function of the catalogue is there, in its order, with an id that is its name', () => {
  expect(metadata.functions.map(({ id, name }) => [id, name])).toEqual(
    catalogue.map(({ name }) => [name, name]),
  );
});

test('error cells are let through to the functions', () =>
  expect(metadata.allowErrorForDataTypeAny).toBe(true));

describe.each(metadata.functions.map((f) => [f.name, f] as const))(
  '%s keeps the bounds of the format',
  (_, f) => {
    test('id and name', () => {
      expect(f.id).toMatch(/^[a-zA-Z][a-zA-Z0-9._]{2,63}$/);
      expect(f.name).toMatch(/^\p{L}[\p{L}0-9]{2,63}$/u); // stricter: no dot, no underscore
    });

    test('description', () => expect(f.description.length >= 1 && f.description.length <= 1024).toBe(true));

    test('parameters', () => {
      expect(f.parameters.length).toBeLessThanOrEqual(128);
      for (const { name, description, type, dimensionality } of f.parameters) {
        expect(name).toMatch(/^.{1,64}$/);
        expect(description.length >= 1 && description.length <= 512).toBe(true);
        expect(type).toBe('any');
        expect(['scalar', 'matrix']).toContain(dimensionality);
      }
    });

    test('no needed parameter follows an optional one', () => {
      const optionals = f.parameters.map(({ optional: isOptional }) => isOptional === true);
      expect(optionals).toEqual([...optionals].sort((a, b) => Number(a) - Number(b)));
    });

    test('a function with [detail] may spill', () => {
      if (f.parameters.some(({ name }) => name === 'detail')) expect(f.result.dimensionality).toBe('matrix');
    });

    test('where arguments come in, their addresses are asked for: a blank cell arrives as 0', () =>
      expect(f.options?.requiresParameterAddresses ?? false).toBe(f.parameters.length > 0));

    test('nothing but what the format knows', () => {
      const { options, ...others } = f;
      expect(Object.keys(others).sort()).toEqual(['description', 'id', 'name', 'parameters', 'result']);
      expect(['cancelable', 'requiresParameterAddresses']).toEqual(
        expect.arrayContaining(Object.keys(options ?? {})),
      );
      for (const value of Object.values(options ?? {})) expect(value).toBe(true);
      for (const parameter of f.parameters) {
        const { optional: isOptional, ...rest } = parameter;
        expect(Object.keys(rest).sort()).toEqual(['description', 'dimensionality', 'name', 'type']);
        expect([true, undefined]).toContain(isOptional);
      }
    });
  },
);

test('help tells unit, bounds and what leaving out means', () => {
  expect(parameterHelp(number({ help: 'volume', unit: 'mL', atLeast: 0 }))).toBe(
    'volume (unit: mL; 0 or more)',
  );
  expect(parameterHelp(optional(number({ help: 'degree', whole: true, atLeast: 1, atMost: 5 }), 2))).toBe(
    'degree (a whole number from 1 to 5; left out: 2)',
  );
  expect(parameterHelp(detail())).toMatch(/\(left out: FALSE\)$/);
});

test('a help link is given only where help pages stand', () => {
  expect(JSON.stringify(metadata)).not.toContain('helpUrl');
  const [first] = functionsMetadata(catalogue, { helpBase: 'https://example.org/help' }).functions;
  expect(first.helpUrl).toBe(`https://example.org/help/${first.name.toLowerCase()}.html`);
});
