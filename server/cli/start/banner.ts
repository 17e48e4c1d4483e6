import type { DemoAccess } from '#server/services/demo-studio/index.ts';
import { isLoopback, originsOf } from './addresses.ts';

const table = (rows: readonly (readonly string[])[]): string[] => {
  const widths = (rows[0] ?? []).map((_, column) => Math.max(...rows.map((row) => row[column]?.length ?? 0)));
  return rows.map((row) =>
    `  ${row.map((cell, column) => cell.padEnd(widths[column] ?? 0)).join('  ')}`.trimEnd(),
  );
};

const demoLines = (host: string, { signIns, enrolmentCode }: DemoAccess): string[] => {
  const rows = signIns.map(({ role, name, login, password, pin }) => [role, name, login, password, pin]);
  const warning = 'Everyone on this network can use these; change them at the desk before real work.';
  return [
    '',
    'Demo studio (desk: login and password; terminal: person and PIN)',
    ...table([['role', 'name', 'login', 'password', 'PIN'], ...rows]),
    ...(enrolmentCode ? [`  Enrol a browser as a terminal, once, with the code ${enrolmentCode}`] : []),
    ...(isLoopback(host) ? [] : [warning]),
  ];
};

/** The lines that greet the person who started the server: addresses, demo sign-ins, and how to stop. */
export const bannerLines = (host: string, port: number, demo: DemoAccess | null): readonly string[] => [
  '',
  'Ladlemark is ready.',
  ...table(
    originsOf(host, port).flatMap((origin) => [
      ['desk', `${origin}/`],
      ['terminal', `${origin}/kiosk`],
    ]),
  ),
  ...(demo ? demoLines(host, demo) : []),
  '',
  'Stop with Ctrl-C.',
];
