import { markedMetal } from '#shared/domain/alloy/alloy-family.ts';
import { figuresOfComposition } from '#shared/domain/alloy/figures-of-composition.ts';
import { metalForWax } from '#shared/domain/pour-card/card-figures.ts';
import { defaultInstruction } from '#shared/domain/instruction/default-instruction.ts';
import { defaultProcessTables } from '#shared/domain/studio/process-tables.ts';
import { defaultStudioLimits } from '#shared/domain/studio/studio-limits.ts';
import { buildCode, buildFlaskCode } from '#shared/lib/codes.ts';
import type { AlloyRevision } from '../../models/alloy-revision.ts';
import type { Casting } from '../../models/casting.ts';
import type { Flask } from '../../models/flask.ts';
import type { User } from '../../models/user.ts';
import { hashSecret, hashToken, pepperedPin } from '../hashing.ts';
import type { Services } from '../services.ts';
import { demoAlloys, type DemoAlloy } from './alloys.ts';
import { demoCastings, demoFlasks, type DemoCasting } from './castings.ts';
import { demoEnrolmentCode, demoPeople } from './people.ts';

const enrolmentDays = 30;

/** What was made, for those who go on from here. */
export interface SeededRecords {
  readonly people: ReadonlyMap<string, User>;
  /** The approved revision of each alloy, by the alloy's key. */
  readonly revisions: ReadonlyMap<string, AlloyRevision>;
  readonly castings: readonly (readonly [DemoCasting, Casting])[];
}

const found = <Value>(value: Value | undefined, what: string): Value => {
  if (value === undefined) throw new Error(`The demo studio has no ${what}.`);
  return value;
};

const seedPeople = async ({ models, secrets }: Services): Promise<Map<string, User>> => {
  const rows = await Promise.all(
    demoPeople.map(async ({ name, login, roles, password, pin }) => ({
      name,
      login,
      roles: [...roles],
      passwordHash: await hashSecret(password),
      pinHash: await hashSecret(pepperedPin(pin, secrets.pinPepper)),
    })),
  );
  const users = await models.User.bulkCreate(rows);
  return new Map(users.map((user) => [user.login, user]));
};

const seedRevision = async (
  { models, now }: Services,
  alloy: DemoAlloy,
  owner: User,
  checker: User,
): Promise<AlloyRevision> => {
  const { name, family, compositionWt, toleranceWt, fineness, quench } = alloy;
  const held = (compositionWt[markedMetal(family)] ?? 0) * 10;
  if (held < fineness) throw new Error(`${name} of the demo studio falls short of its mark.`);
  const outcome = figuresOfComposition(compositionWt, null);
  if (!outcome.ok) throw new Error(`${name} of the demo studio cannot be computed: ${outcome.error}`);
  const row = await models.Alloy.create({ name, family });
  return models.AlloyRevision.create({
    alloyId: row.id,
    number: 1,
    status: 'approved',
    compositionWt: { ...compositionWt },
    toleranceWt: { ...toleranceWt },
    fineness,
    ...outcome.value,
    quench,
    measured: null,
    draftedBy: owner.id,
    checkedBy: checker.id,
    checkedAt: now(),
    approvedBy: owner.id,
    approvedAt: now(),
  });
};

const seedFlasks = async ({ models }: Services): Promise<Map<number, Flask>> => {
  const flasks = await models.Flask.bulkCreate(
    demoFlasks.map(([number, diameterMm, heightMm]) => ({
      code: buildFlaskCode(number),
      diameterMm,
      heightMm,
    })),
  );
  return new Map(demoFlasks.map(([number], index) => [number, found(flasks[index], `flask ${number}`)]));
};

/** Metal for a tree rounded to the half decigram a planner writes down. */
const plannedMetal = (casting: DemoCasting, revision: AlloyRevision): number =>
  Math.round(metalForWax(casting.tree.waxMassG, revision.figures.densityGPerCm3, defaultProcessTables) * 20) /
  20;

/** Makes the demo studio's people, alloys, flasks, trees and castings; joins the caller's transaction. */
export const seedRecords = async (services: Services): Promise<SeededRecords> => {
  const { models, now } = services;
  const people = await seedPeople(services);
  const owner = found(people.get('maren'), 'owner');
  const checker = found(people.get('ines'), 'checker');
  await models.TerminalEnrolment.create({
    codeHash: hashToken(demoEnrolmentCode.replace(/\D/g, '')),
    name: 'Terminal 1',
    bay: 'furnace bay 1',
    createdBy: owner.id,
    expiresAt: new Date(now().getTime() + enrolmentDays * 24 * 3600 * 1000),
  });
  await models.WorkInstructionRevision.create({
    number: 1,
    content: defaultInstruction,
    approvedBy: owner.id,
  });
  const revisions = new Map<string, AlloyRevision>();
  for (const alloy of demoAlloys)
    revisions.set(alloy.key, await seedRevision(services, alloy, owner, checker));
  const flasks = await seedFlasks(services);
  const castings: (readonly [DemoCasting, Casting])[] = [];
  for (const demo of demoCastings) {
    const revision = found(revisions.get(demo.alloy), demo.alloy);
    const { number, ...treeValues } = demo.tree;
    const tree = await models.Tree.create({ code: buildCode('T', number), ...treeValues });
    const casting = await models.Casting.create({
      flaskId: found(flasks.get(demo.flask), `flask ${demo.flask}`).id,
      treeId: tree.id,
      alloyRevisionId: revision.id,
      method: demo.method,
      state: demo.state,
      stateReason: demo.stateReason ?? '',
      plannedMetalG: plannedMetal(demo, revision),
      plannedPourAt: new Date(Math.round((now().getTime() + demo.inMinutes * 60_000) / 300_000) * 300_000),
      bay: demo.bay,
      plannedBy: owner.id,
      casterId: demo.caster === null ? null : found(people.get(demo.caster), demo.caster).id,
    });
    castings.push([demo, casting]);
  }
  await models.StudioSettings.create({
    name: 'Emberhythe Castings',
    temperatureUnit: 'C',
    massUnit: 'g',
    timeZone: Intl.DateTimeFormat().resolvedOptions().timeZone,
    idleLockS: 180,
    processTables: defaultProcessTables,
    limits: defaultStudioLimits,
  });
  return { people, revisions, castings };
};
