import { QueryTypes } from 'sequelize';
import { afterEach, beforeEach, describe, expect, inject, it } from 'vitest';
import { createMigrator, migrate } from '#server/services/migrator.ts';
import { cloneTemplate, type TestDatabase } from '#tests/support/template-database.ts';

let database: TestDatabase;
beforeEach(async () => {
  database = await cloneTemplate(inject('postgresUrl'), { template: false });
});
afterEach(() => database.drop());

const id = (digit: number): string => `00000000-0000-4000-8000-00000000000${digit}`;

const oldContent = {
  title: 'Pour one flask',
  prompts: [
    { key: 'face', sign: 'face-shield', sentence: 'Face shield down.' },
    { key: 'dry', sign: 'dry-charge', sentence: 'Everything is dry.' },
  ],
  sentences: {},
  emergencyText: 'Step back.',
  deference: 'Local codes come first.',
};

/** A running card as it was written before instructions had steps. */
const runningCard = /* sql */ `
insert into users (id, name, login, roles, password_hash) values ('${id(1)}', 'Someone', 'someone', '{caster}', 'x');
insert into terminals (id, name, bay, token_hash) values ('${id(2)}', 'Terminal', 'bay', 'x');
insert into alloys (id, name, family) values ('${id(3)}', 'Sterling', 'silver');
insert into alloy_revisions (id, alloy_id, number, composition_wt, fineness, figures, quench, drafted_by)
  values ('${id(4)}', '${id(3)}', 1, '{}', 925, '{}', '{}', '${id(1)}');
insert into flasks (id, code, diameter_mm, height_mm) values ('${id(5)}', 'LM-0147-5', 89, 100);
insert into trees (id, code, description, wax_mass_g, thinnest_section_mm, pieces) values ('${id(6)}', 'T-0001-2', 'rings', 5, 1, 4);
insert into work_instruction_revisions (id, number, content) values ('${id(7)}', 1, '${JSON.stringify(oldContent)}');
insert into castings (id, flask_id, tree_id, alloy_revision_id, method, state, planned_metal_g, planned_pour_at, bay, planned_by)
  values ('${id(8)}', '${id(5)}', '${id(6)}', '${id(4)}', 'vacuum', 'holding', 80, now(), 'bay', '${id(1)}');
insert into melts (code, casting_id, alloy_revision_id, work_instruction_revision_id, context, state, opened_by, terminal_id, opened_at)
  values ('M-0001-4', '${id(8)}', '${id(4)}', '${id(7)}', '{"plannedMetalG": 80}', '{}', '${id(1)}', '${id(2)}', now());
`;

const read = async <Row extends object>(sql: string): Promise<Row | undefined> =>
  (await database.sequelize.query<Row>(sql, { type: QueryTypes.SELECT }))[0];

describe('an upgrade to instructions with steps', () => {
  it('makes a check of each caution, also for the card that is running, and goes back again', async () => {
    const migrator = createMigrator(database.sequelize);
    await migrator.up({ to: '2026-12-01T1100-metal' });
    await database.sequelize.query(runningCard);
    await migrate(database.sequelize);
    const instruction = await read<{ content: object }>('select content from work_instruction_revisions');
    const steps = oldContent.prompts.map(({ key, sign, sentence }) => ({
      kind: 'check',
      key,
      sign,
      sentence,
      before: 'guard',
      maySkip: false,
      when: { methods: [], families: [], roles: [], hazards: [] },
    }));
    expect(instruction?.content).toEqual({
      title: oldContent.title,
      sentences: {},
      emergencyText: oldContent.emergencyText,
      deference: oldContent.deference,
      steps,
    });
    const melt = await read<{ context: object }>('select context from melts');
    expect(melt?.context).toEqual({
      plannedMetalG: 80,
      rules: { steps, flaskCode: 'LM-0147-5', countersignFactor: 1.5 },
    });
    await createMigrator(database.sequelize).down({ to: '2026-12-01T1200-shift' });
    expect(await read('select content from work_instruction_revisions')).toEqual({ content: oldContent });
  });
});
