import { describe, expect, it } from 'vitest';
import { PROJECTS, readChoice, STATIC_CHECKS } from './choice.ts';

describe('readChoice', () => {
  it('takes no word as everything', () => {
    expect(readChoice([])).toEqual({ staticChecks: STATIC_CHECKS, projects: PROJECTS, paths: [] });
  });

  it('takes a path as the tests there, without the static checks', () => {
    expect(readChoice(['tests/api/melts.test.ts'])).toEqual({
      staticChecks: [],
      projects: PROJECTS,
      paths: ['tests/api/melts.test.ts'],
    });
  });

  it.each([[['--only', 'api,types']], [['--only=types,api']], [['--only', 'api', '--only', 'types']]])(
    'takes %j as those alone',
    (args) => expect(readChoice(args)).toEqual({ staticChecks: ['types'], projects: ['api'], paths: [] }),
  );

  it('narrows a project to a path', () => {
    expect(readChoice(['--only', 'api', 'melts'])).toEqual({
      staticChecks: [],
      projects: ['api'],
      paths: ['melts'],
    });
  });

  it.each([[['--only', 'apo']], [['--only']], [['--watch']]])('refuses %j', (args) =>
    expect(() => readChoice(args)).toThrow(),
  );
});
