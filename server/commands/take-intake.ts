import { createHash } from 'node:crypto';
import type { z } from 'zod';
import type { IntakeResult, takeIntakeRequest } from '#shared/contracts/lot-intake.ts';
import { AppError, fieldError } from '../errors.ts';
import type { SignedIn } from '../policies/actor.ts';
import { readIntake, type ReadRow } from '../queries/read-intake.ts';
import type { Services } from '../services/services.ts';
import { takeLotIn } from './receive-lot.ts';

/** A key for one row of a sheet: the same whenever the same sheet is sent again. */
const keyOfRow = (sheet: string, line: number): string => {
  const hex = createHash('sha256').update(`${sheet} ${line}`).digest('hex');
  return `${hex.slice(0, 8)}-${hex.slice(8, 12)}-4${hex.slice(13, 16)}-8${hex.slice(17, 20)}-${hex.slice(20, 32)}`;
};

const refuseUntold = (rows: readonly ReadRow[], good: readonly ReadRow[], onlyGood: boolean): void => {
  const left = rows.length - good.length;
  if (good.length === 0) throw fieldError('text', 'No row of the sheet can be taken in.');
  if (left > 0 && !onlyGood) {
    throw new AppError(
      'entry-questioned',
      `${left} of ${rows.length} rows cannot be taken in as they are. Put them right, or take the good ones only.`,
    );
  }
};

/** Rows of the same sheet that an earlier delivery of its key took in. */
const takenBefore = async ({ models }: Services, keys: readonly string[]): Promise<ReadonlySet<string>> => {
  const movements = await models.MetalMovement.findAll({ where: { key: [...keys] }, attributes: ['key'] });
  return new Set(movements.map(({ key }) => key));
};

/** Takes in the good rows of a sheet, all of them or none; the same sheet sent again takes in nothing. */
export const takeIntake = (
  services: Services,
  actor: SignedIn,
  { key, text, onlyGood, confirmed }: z.output<typeof takeIntakeRequest>,
): Promise<IntakeResult> =>
  services.sequelize.transaction(async () => {
    const sheet = await readIntake(services, text);
    if (typeof sheet === 'string') throw fieldError('text', sheet);
    const rows = sheet.rows.map((row) => ({ ...row, key: keyOfRow(key, row.line) }));
    const before = await takenBefore(
      services,
      rows.map((row) => row.key),
    );
    const good = rows.filter(
      (row) => row.lot !== null && (confirmed || row.questions.length === 0 || before.has(row.key)),
    );
    refuseUntold(rows, good, onlyGood);
    const codes: string[] = [];
    for (const { lot, key: rowKey } of good) {
      if (!lot) continue;
      const { received, alloy: _alloy, ...values } = lot;
      const taken = await takeLotIn(services, actor, {
        ...values,
        key: rowKey,
        receivedAt: received === '' ? services.now().toISOString() : `${received}T12:00:00Z`,
        quarantineReason: '',
        confirmed: true,
      });
      codes.push(taken.code);
    }
    return { codes, left: rows.length - good.length };
  });
