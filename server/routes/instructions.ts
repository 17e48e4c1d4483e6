import { idParams } from '#shared/contracts/common.ts';
import {
  approveInstructionRequest,
  changeInstructionRequest,
  draftInstructionRequest,
  dropInstructionRequest,
} from '#shared/contracts/instruction.ts';
import { approveInstruction } from '../commands/approve-instruction.ts';
import { changeInstruction } from '../commands/change-instruction.ts';
import { draftInstruction } from '../commands/draft-instruction.ts';
import { dropInstruction } from '../commands/drop-instruction.ts';
import type { Actor } from '../policies/actor.ts';
import { instructionDraftPolicy, instructionPolicy } from '../policies/instruction.ts';
import { presentInstruction, presentInstructionList } from '../presenters/instruction.ts';
import {
  listInstructions,
  loadInstructionGround,
  loadInstructionRevision,
} from '../queries/list-instructions.ts';
import type { Services } from '../services/services.ts';
import { defineRoute } from './define-route.ts';
import { requirePerson } from './require-actor.ts';

const presentById = async (services: Services, id: string, actor: Actor) =>
  presentInstruction(
    await loadInstructionRevision(services, id),
    await loadInstructionGround(services),
    actor,
  );

const list = defineRoute({
  method: 'get',
  path: '/api/instructions',
  policy: instructionPolicy.list,
  act: async ({ actor, services }) =>
    presentInstructionList(await listInstructions(services), await loadInstructionGround(services), actor),
});

const read = defineRoute({
  method: 'get',
  path: '/api/instructions/:id',
  policy: instructionPolicy.read,
  params: idParams,
  act: ({ actor, services, params }) => presentById(services, params.id, actor),
});

const draft = defineRoute({
  method: 'post',
  path: '/api/instructions',
  policy: instructionPolicy.draft,
  body: draftInstructionRequest,
  status: 201,
  act: async ({ actor, services, body }) => {
    const from = await loadInstructionRevision(services, body.from);
    const { id } = await draftInstruction(services, requirePerson(actor), from);
    return presentById(services, id, actor);
  },
});

const change = defineRoute({
  method: 'patch',
  path: '/api/instructions/:id',
  policy: instructionDraftPolicy.change,
  params: idParams,
  body: changeInstructionRequest,
  load: (services, params) => loadInstructionRevision(services, params.id),
  act: async ({ actor, services, params, body }) => {
    await changeInstruction(services, requirePerson(actor), params.id, body);
    return presentById(services, params.id, actor);
  },
});

const drop = defineRoute({
  method: 'post',
  path: '/api/instructions/:id/drop',
  policy: instructionDraftPolicy.drop,
  params: idParams,
  body: dropInstructionRequest,
  load: (services, params) => loadInstructionRevision(services, params.id),
  act: async ({ actor, services, params, body }) => {
    await dropInstruction(services, { id: params.id, ...body });
    return presentById(services, params.id, actor);
  },
});

const approve = defineRoute({
  method: 'post',
  path: '/api/instructions/:id/approve',
  policy: instructionDraftPolicy.approve,
  params: idParams,
  body: approveInstructionRequest,
  load: (services, params) => loadInstructionRevision(services, params.id),
  act: async ({ actor, services, params, body }) => {
    await approveInstruction(services, requirePerson(actor), params.id, body);
    return presentById(services, params.id, actor);
  },
});

export const instructionRoutes = [list, read, draft, change, drop, approve];
