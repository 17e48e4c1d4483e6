import { inject } from 'vitest';
import { cloneTemplate, type TestDatabase } from './template-database.ts';

export type { TestDatabase };

/** Makes a migrated, empty database for one test file; the file drops it in `afterAll`. */
export const createTestDatabase = (): Promise<TestDatabase> => cloneTemplate(inject('postgresUrl'));
