import { reconciliationQuery } from '#shared/contracts/reconciliation.ts';
import { sendDownload } from '../middlewares/send-download.ts';
import { ledgerPolicy } from '../policies/ledger.ts';
import { loadStudio } from '../queries/load-studio.ts';
import { readReconciliation } from '../queries/read-reconciliation.ts';
import { monthCsv } from '../services/reports/month-csv.ts';
import { monthPdf } from '../services/reports/month-pdf.ts';
import { defineRoute } from './define-route.ts';

const read = defineRoute({
  method: 'get',
  path: '/api/metal/reconciliation',
  policy: ledgerPolicy.reconcile,
  query: reconciliationQuery,
  act: ({ services, query }) => readReconciliation(services, query.month),
});

const asCsv = defineRoute({
  method: 'get',
  path: '/api/metal/reconciliation.csv',
  policy: ledgerPolicy.reconcile,
  query: reconciliationQuery,
  act: async ({ services, query, http }) => {
    const month = await readReconciliation(services, query.month);
    sendDownload(http, 'text/csv; charset=utf-8', `metal-${query.month}.csv`, monthCsv(month));
  },
});

const asPdf = defineRoute({
  method: 'get',
  path: '/api/metal/reconciliation.pdf',
  policy: ledgerPolicy.reconcile,
  query: reconciliationQuery,
  act: async ({ services, query, http }) => {
    const { name } = await loadStudio(services);
    const month = await readReconciliation(services, query.month);
    const pdf = await monthPdf(month, { studio: name, printedAt: services.now() });
    sendDownload(http, 'application/pdf', `metal-${query.month}.pdf`, pdf);
  },
});

export const reconciliationRoutes = [read, asCsv, asPdf];
