import { createBrowserRouter, type RouteObject } from 'react-router-dom';
import { Spinner } from '#src/ui/spinner.tsx';
import { ErrorPage } from './error-page.tsx';
import { NotFoundPage } from './not-found-page.tsx';
import { SessionGate } from './session-gate.tsx';
import { Shell } from './shell.tsx';

const pages: readonly RouteObject[] = [
  {
    index: true,
    lazy: async () => ({ Component: (await import('../features/today/today-page.tsx')).TodayPage }),
  },
  {
    path: 'melts',
    lazy: async () => ({ Component: (await import('../features/melts/melts-page.tsx')).MeltsPage }),
  },
  {
    path: 'melts/:meltId',
    lazy: async () => ({ Component: (await import('../features/melts/melt-page.tsx')).MeltPage }),
  },
  {
    path: 'alloys',
    lazy: async () => ({ Component: (await import('../features/alloys/alloys-page.tsx')).AlloysPage }),
  },
  {
    path: 'alloys/:alloyId',
    lazy: async () => ({ Component: (await import('../features/alloys/alloy-page.tsx')).AlloyPage }),
  },
  {
    path: 'metal',
    lazy: async () => ({ Component: (await import('../features/metal/metal-page.tsx')).MetalPage }),
  },
  {
    path: 'metal/receive',
    lazy: async () => ({ Component: (await import('../features/metal/receive-page.tsx')).ReceivePage }),
  },
  {
    path: 'metal/intake',
    lazy: async () => ({ Component: (await import('../features/metal/intake-page.tsx')).IntakePage }),
  },
  {
    path: 'metal/pot',
    lazy: async () => ({ Component: (await import('../features/metal/pot-page.tsx')).PotPage }),
  },
  {
    path: 'metal/crucibles/:meltId',
    lazy: async () => ({ Component: (await import('../features/metal/crucible-page.tsx')).CruciblePage }),
  },
  {
    path: 'metal/lots/:lotId',
    lazy: async () => ({ Component: (await import('../features/metal/lot-page.tsx')).LotPage }),
  },
  {
    path: 'metal/plan',
    lazy: async () => ({ Component: (await import('../features/metal/plan-page.tsx')).PlanPage }),
  },
  {
    path: 'metal/month',
    lazy: async () => ({ Component: (await import('../features/metal/month-page.tsx')).MonthPage }),
  },
  {
    path: 'flasks',
    lazy: async () => ({ Component: (await import('../features/flasks/flasks-page.tsx')).FlasksPage }),
  },
  {
    path: 'instructions',
    lazy: async () => ({
      Component: (await import('../features/instructions/instructions-page.tsx')).InstructionsPage,
    }),
  },
  {
    path: 'instructions/:instructionId',
    lazy: async () => ({
      Component: (await import('../features/instructions/instruction-page.tsx')).InstructionPage,
    }),
  },
  {
    path: 'people',
    lazy: async () => ({ Component: (await import('../features/people/people-page.tsx')).PeoplePage }),
  },
  {
    path: 'people/new',
    lazy: async () => ({ Component: (await import('../features/people/new-person-page.tsx')).NewPersonPage }),
  },
  {
    path: 'people/:personId',
    lazy: async () => ({ Component: (await import('../features/people/person-page.tsx')).PersonPage }),
  },
  {
    path: 'terminals',
    lazy: async () => ({
      Component: (await import('../features/terminals/terminals-page.tsx')).TerminalsPage,
    }),
  },
  {
    path: 'instruments',
    lazy: async () => ({
      Component: (await import('../features/instruments/instruments-page.tsx')).InstrumentsPage,
    }),
  },
  {
    path: 'studio',
    lazy: async () => ({ Component: (await import('../features/studio/studio-page.tsx')).StudioPage }),
  },
  { path: '*', Component: NotFoundPage },
];

const prints: readonly RouteObject[] = [
  {
    path: 'print/flasks',
    lazy: async () => ({
      Component: (await import('../features/print/plate-sheet-page.tsx')).PlateSheetPage,
    }),
  },
  {
    path: 'print/flasks/:code',
    lazy: async () => ({
      Component: (await import('../features/print/flask-plate-page.tsx')).FlaskPlatePage,
    }),
  },
  {
    path: 'print/lots/:lotId',
    lazy: async () => ({ Component: (await import('../features/metal/lot-label-page.tsx')).LotLabelPage }),
  },
  {
    path: 'print/instructions/:instructionId',
    lazy: async () => ({
      Component: (await import('../features/instructions/print-instruction-page.tsx')).PrintInstructionPage,
    }),
  },
  {
    path: 'print/castings/:castingId',
    lazy: async () => ({ Component: (await import('../features/print/traveller-page.tsx')).TravellerPage }),
  },
];

const routes: RouteObject[] = [
  {
    Component: SessionGate,
    errorElement: <ErrorPage />,
    hydrateFallbackElement: (
      <p className="p-10">
        <Spinner label="Opening the desk" />
      </p>
    ),
    children: [
      { Component: Shell, children: [{ errorElement: <ErrorPage />, children: [...pages] }] },
      { errorElement: <ErrorPage />, children: [...prints] },
    ],
  },
];

/** Makes the router of the desk; each page is loaded when it is first opened. */
export const createDeskRouter = () => createBrowserRouter(routes);
