import { Op } from 'sequelize';
import { hashToken, pepperedPin, verifySecret } from '../hashing.ts';
import type { Services } from '../services.ts';
import { demoEnrolmentCode, demoPeople } from './people.ts';
import { seedInstruments } from './seed-instruments.ts';
import { seedLots } from './seed-lots.ts';
import { seedPastMelts } from './seed-past-melts.ts';
import { seedRecords } from './seed-records.ts';

/** One sign-in of the demo studio, as it is printed at the start. */
export interface DemoSignIn {
  readonly role: string;
  readonly name: string;
  readonly login: string;
  readonly password: string;
  readonly pin: string;
}

/** The published keys that still open the studio. */
export interface DemoAccess {
  readonly signIns: readonly DemoSignIn[];
  /** Null once it has been used. */
  readonly enrolmentCode: string | null;
}

/** Makes the demo studio when the database holds no studio yet; resolves to whether it did. */
export const seedDemoStudio = async (services: Services): Promise<boolean> => {
  const { sequelize, models } = services;
  const records = await sequelize.transaction(async () => {
    // Two servers may start at once on one empty database: the second waits here and then finds the studio made.
    await sequelize.query('lock table studio_settings in exclusive mode');
    return (await models.StudioSettings.count()) > 0 ? null : seedRecords(services);
  });
  if (!records) return false;
  await seedPastMelts(services, records, await seedLots(services, records));
  await seedInstruments(services, records);
  return true;
};

/** Which of the demo studio's published keys still work, so that they can be told; null when none does. */
export const readDemoAccess = async ({ models, secrets }: Services): Promise<DemoAccess | null> => {
  const logins = demoPeople.map(({ login }) => login);
  const users = await models.User.findAll({ where: { login: { [Op.in]: logins }, active: true } });
  const signIns = await Promise.all(
    demoPeople.map(async ({ name, login, roles, password, pin }) => {
      const user = users.find((candidate) => candidate.login === login);
      if (!user?.pinHash) return [];
      const unchanged =
        (await verifySecret(password, user.passwordHash)) &&
        (await verifySecret(pepperedPin(pin, secrets.pinPepper), user.pinHash));
      return unchanged ? [{ role: roles.join(' and '), name, login, password, pin }] : [];
    }),
  );
  if (signIns.flat().length === 0) return null;
  const enrolment = await models.TerminalEnrolment.findOne({
    where: {
      codeHash: hashToken(demoEnrolmentCode.replace(/\D/g, '')),
      usedAt: null,
      expiresAt: { [Op.gt]: new Date() },
    },
  });
  return { signIns: signIns.flat(), enrolmentCode: enrolment ? demoEnrolmentCode : null };
};
