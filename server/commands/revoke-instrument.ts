import type { Instrument } from '../models/instrument.ts';
import type { Services } from '../services/services.ts';
import { lockRow } from './lock-row.ts';

/** Ends an instrument at once: its token opens nothing any more; what it has sent stays. */
export const revokeInstrument = ({ sequelize, now }: Services, instrument: Instrument): Promise<Instrument> =>
  sequelize.transaction(async () => {
    await lockRow(instrument);
    return instrument.update({ active: false, revokedAt: instrument.revokedAt ?? now() });
  });
