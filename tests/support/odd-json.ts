import fc from 'fast-check';

type Json = null | boolean | number | string | readonly Json[] | { readonly [key: string]: Json };

const nested = (depth: number): Json => {
  let value: Json = 'deep';
  for (let level = 0; level < depth; level += 1) value = level % 2 === 0 ? [value] : { inner: value };
  return value;
};

/** Keys that mean something to JavaScript itself, as JSON text alone can make them. */
const prototypeKeys = (): Json =>
  JSON.parse('{"__proto__": {"isOwner": true}, "constructor": {"prototype": 1}, "toString": null}') as Json;

const oddStrings = [
  '',
  ' ',
  '\u0000',
  'a\u0000b',
  '\ud800',
  '\udfff\ud800',
  '\u202e',
  '\ufeff',
  'İ',
  '🔥'.repeat(40),
  "' or 1=1; --",
  '$1',
  '${7*7}',
  '__proto__',
  'NaN',
  '12,5',
  '1e9',
  '2026-12-01',
  '0000-01-01T00:00:00Z',
  '9999-12-31T23:59:59Z',
  '00000000-0000-0000-0000-000000000000',
  'x'.repeat(10_000),
];
const oddNumbers = [0, -0, -1, 0.1, 5e-324, 1e-300, 1e9, 2 ** 31, 2 ** 53, -(2 ** 63), 1e308, -1e308];

/** Any JSON value, with a leaning to those that break things. */
export const oddJson = (): fc.Arbitrary<Json> =>
  fc.oneof(
    fc.constantFrom<Json>(...oddStrings),
    fc.constantFrom<Json>(...oddNumbers),
    fc.constantFrom<Json>(null, true, false, [], {}, [[]], [null], nested(40), nested(2_000)),
    fc.constant(null).map(prototypeKeys),
    fc.jsonValue({ maxDepth: 3 }) as fc.Arbitrary<Json>,
  );

const pathsOf = (value: unknown, path: readonly string[] = []): string[][] => {
  const below =
    value !== null && typeof value === 'object'
      ? Object.entries(value).flatMap(([key, part]) => pathsOf(part, [...path, key]))
      : [];
  return [[...path], ...below];
};

const replaced = (value: unknown, [key, ...rest]: readonly string[], odd: Json | undefined): unknown => {
  if (key === undefined) return odd;
  if (Array.isArray(value))
    return value.map((part, index) =>
      String(index) === key ? replaced(part, rest, odd) : (part as unknown),
    );
  const { [key]: part, ...others } = value as Record<string, unknown>;
  return rest.length === 0 && odd === undefined ? others : { ...others, [key]: replaced(part, rest, odd) };
};

/** A good request with something odd, or nothing, in one of its places. */
export const spoilt = (good: object): fc.Arbitrary<unknown> =>
  fc
    .tuple(fc.constantFrom(...pathsOf(good)), fc.option(oddJson(), { nil: undefined }))
    .map(([path, odd]) => replaced(good, path, odd) ?? null);
