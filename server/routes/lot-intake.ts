import { previewIntakeRequest, takeIntakeRequest } from '#shared/contracts/lot-intake.ts';
import { takeIntake } from '../commands/take-intake.ts';
import { lotPolicy } from '../policies/lot.ts';
import { previewIntake } from '../queries/read-intake.ts';
import { defineRoute } from './define-route.ts';
import { requirePerson } from './require-actor.ts';

const preview = defineRoute({
  method: 'post',
  path: '/api/lot-intake/preview',
  policy: lotPolicy.receive,
  body: previewIntakeRequest,
  act: ({ services, body }) => previewIntake(services, body.text),
});

const take = defineRoute({
  method: 'post',
  path: '/api/lot-intake',
  policy: lotPolicy.receive,
  body: takeIntakeRequest,
  status: 201,
  act: ({ actor, services, body }) => takeIntake(services, requirePerson(actor), body),
});

export const lotIntakeRoutes = [preview, take];
