import { alloyRoutes } from './alloys.ts';
import { cardRoutes } from './cards.ts';
import { castingRoutes } from './castings.ts';
import { chargeRoutes } from './charges.ts';
import { coolingCurveRoutes } from './cooling-curves.ts';
import type { Route } from './define-route.ts';
import { flaskCoolingRoutes } from './flask-cooling.ts';
import { flaskRoutes } from './flasks.ts';
import { healthRoutes } from './health.ts';
import { instrumentReadingRoutes } from './instrument-readings.ts';
import { instrumentRoutes } from './instruments.ts';
import { instructionRoutes } from './instructions.ts';
import { ledgerRoutes } from './ledger.ts';
import { lotDocumentRoutes } from './lot-documents.ts';
import { lotIntakeRoutes } from './lot-intake.ts';
import { lotRoutes } from './lots.ts';
import { meltRoutes } from './melts.ts';
import { peopleRoutes } from './people.ts';
import { photographRoutes } from './photographs.ts';
import { reconciliationRoutes } from './reconciliation.ts';
import { sessionRoutes } from './sessions.ts';
import { studioRoutes } from './studio.ts';
import { terminalRoutes } from './terminals.ts';

/** Every route of the server; a test walks them as every role. */
export const routes: readonly Route[] = [
  ...healthRoutes,
  ...sessionRoutes,
  ...terminalRoutes,
  ...peopleRoutes,
  ...studioRoutes,
  ...alloyRoutes,
  ...flaskRoutes,
  ...castingRoutes,
  ...cardRoutes,
  ...meltRoutes,
  ...photographRoutes,
  ...instructionRoutes,
  ...lotRoutes,
  ...lotDocumentRoutes,
  ...lotIntakeRoutes,
  ...ledgerRoutes,
  ...chargeRoutes,
  ...reconciliationRoutes,
  ...instrumentRoutes,
  ...instrumentReadingRoutes,
  ...flaskCoolingRoutes,
  ...coolingCurveRoutes,
];
