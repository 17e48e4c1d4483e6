import { idParams } from '#shared/contracts/common.ts';
import { createEnrolmentRequest, enrolTerminalRequest } from '#shared/contracts/terminal.ts';
import { createEnrolment } from '../commands/create-enrolment.ts';
import { enrolTerminal } from '../commands/enrol-terminal.ts';
import { revokeTerminal } from '../commands/revoke-terminal.ts';
import { keepTerminalToken } from '../middlewares/terminal-token.ts';
import { terminalPolicy } from '../policies/terminal.ts';
import { presentTerminal } from '../presenters/terminal.ts';
import { listTerminals, loadTerminal } from '../queries/load-terminal.ts';
import { defineRoute } from './define-route.ts';
import { requirePerson } from './require-actor.ts';

const list = defineRoute({
  method: 'get',
  path: '/api/terminals',
  policy: terminalPolicy.list,
  act: async ({ actor, services }) =>
    (await listTerminals(services)).map((terminal) => presentTerminal(terminal, actor)),
});

const makeCode = defineRoute({
  method: 'post',
  path: '/api/terminals/codes',
  policy: terminalPolicy.makeCode,
  body: createEnrolmentRequest,
  status: 201,
  act: ({ actor, services, body }) => createEnrolment(services, requirePerson(actor), body),
});

const enrol = defineRoute({
  method: 'post',
  path: '/api/terminals',
  policy: terminalPolicy.enrol,
  body: enrolTerminalRequest,
  status: 201,
  act: async ({ actor, services, body, http }) => {
    const { terminal, token } = await enrolTerminal(services, body.code);
    keepTerminalToken(http, token);
    return presentTerminal(terminal, actor);
  },
});

const revoke = defineRoute({
  method: 'post',
  path: '/api/terminals/:id/revoke',
  policy: terminalPolicy.revoke,
  params: idParams,
  act: async ({ actor, services, params }) =>
    presentTerminal(await revokeTerminal(services, await loadTerminal(services, params.id)), actor),
});

export const terminalRoutes = [list, makeCode, enrol, revoke];
