import type { Sequelize } from 'sequelize';
import type { Models } from '../models/index.ts';
import type { FileStore } from './files/file-store.ts';
import type { Logger } from './logger.ts';
import type { Mailer } from './mailer.ts';
import type { Secrets } from './secrets.ts';

/** What commands and queries work with. */
export interface Services {
  readonly sequelize: Sequelize;
  readonly models: Models;
  readonly secrets: Secrets;
  readonly mailer: Mailer;
  readonly logger: Logger;
  readonly files: FileStore;
  /** The server's clock; tests set it. */
  readonly now: () => Date;
}
