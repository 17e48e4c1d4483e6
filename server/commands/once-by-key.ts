import { UniqueConstraintError } from 'sequelize';
import { AppError } from '../errors.ts';
import type { Services } from '../services/services.ts';

/** How something is recorded exactly once: what stands under its key, whether it is the same, and how it is written. */
export interface OnceByKey<Recorded> {
  readonly find: () => Promise<Recorded | null>;
  readonly isSame: (recorded: Recorded) => boolean;
  readonly write: () => Promise<Recorded>;
}

const checked = <Recorded>(recorded: Recorded, isSame: (recorded: Recorded) => boolean): Recorded => {
  if (isSame(recorded)) return recorded;
  throw new AppError(
    'reading-refused',
    'This delivery carries the key of another one. Make a new key for each; send again only with the same content.',
  );
};

/** Records something exactly once however often it is delivered, also by two at the same moment; says whether it had come before. */
export const onceByKey = async <Recorded>(
  { sequelize }: Services,
  { find, isSame, write }: OnceByKey<Recorded>,
): Promise<{ readonly recorded: Recorded; readonly again: boolean }> => {
  const before = await find();
  if (before !== null) return { recorded: checked(before, isSame), again: true };
  try {
    return { recorded: await sequelize.transaction(write), again: false };
  } catch (error) {
    if (!(error instanceof UniqueConstraintError)) throw error;
    const other = await find();
    if (other === null) throw error;
    return { recorded: checked(other, isSame), again: true };
  }
};
