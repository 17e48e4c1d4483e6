import type { Response } from 'supertest';
import type { Problem, ProblemId } from '#shared/contracts/problem.ts';

/** The stable id of the problem an answer carries, or null when it carries none. */
export const problemIdOf = ({ type, body }: Response): ProblemId | null =>
  type === 'application/problem+json'
    ? ((body as Problem).type.replace('urn:ladlemark:problem:', '') as ProblemId)
    : null;

/** The sentence of the problem an answer carries. */
export const sentenceOf = ({ body }: Response): string => (body as Problem).title;
