import { QueryTypes } from 'sequelize';
import type { Services } from '../services/services.ts';

/**
 * Ends a person's sessions at the desk and at every terminal, but for the one that asks: whoever knew the old password
 * or PIN is out. Joins the caller's transaction.
 */
export const endOtherSessions = async (
  { sequelize }: Services,
  personId: string,
  askingSessionId: string,
): Promise<void> => {
  await sequelize.query(
    `delete from user_sessions where sess->'passport'->>'user' = :personId and sid <> :askingSessionId`,
    { replacements: { personId, askingSessionId }, type: QueryTypes.RAW },
  );
};
