/** The checks that are no tests, by the name `--only` knows them by. */
export const STATIC_CHECKS = ['types', 'lint', 'format'] as const;

/** The test projects of vite.config.ts. */
export const PROJECTS = ['unit', 'ui', 'api', 'e2e', 'faults'] as const;

/** What one run is asked to do. */
export interface Choice {
  readonly staticChecks: readonly string[];
  /** Empty together with `paths` when no vitest test is wanted. */
  readonly projects: readonly string[];
  readonly paths: readonly string[];
}

const EVERYTHING: Choice = { staticChecks: STATIC_CHECKS, projects: PROJECTS, paths: [] };

const isOneOf = (names: readonly string[]) => (name: string) => names.includes(name);

/**
 * Reads the arguments: nothing runs everything, `--only` a comma list of checks and projects, a path the tests of it.
 * Throws an Error that names a word it does not know.
 */
export const readChoice = (args: readonly string[]): Choice => {
  const paths: string[] = [];
  const only: string[] = [];
  for (let index = 0; index < args.length; index += 1) {
    const word = args[index] ?? '';
    if (word === '--only') only.push(...(args[(index += 1)] ?? '').split(','));
    else if (word.startsWith('--only=')) only.push(...word.slice('--only='.length).split(','));
    else if (word.startsWith('-')) throw new Error(`${word} is not known; use --only NAME or a path.`);
    else paths.push(word);
  }
  const unknown = only.find((name) => ![...STATIC_CHECKS, ...PROJECTS].some((known) => known === name));
  if (unknown !== undefined) {
    throw new Error(`--only knows ${[...STATIC_CHECKS, ...PROJECTS].join(', ')}, but not "${unknown}".`);
  }
  if (only.length === 0)
    return paths.length === 0 ? EVERYTHING : { staticChecks: [], projects: PROJECTS, paths };
  return {
    staticChecks: only.filter(isOneOf(STATIC_CHECKS)),
    projects: only.filter(isOneOf(PROJECTS)),
    paths,
  };
};
