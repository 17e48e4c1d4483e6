import { queryOptions } from '@tanstack/react-query';
import type { Reconciliation } from '#shared/contracts/reconciliation.ts';
import { http } from '#src/lib/http.ts';

/** A month of metal, `year-month`, for the owner. */
export const reconciliationQuery = (month: string) =>
  queryOptions({
    queryKey: ['metal', 'reconciliation', month],
    queryFn: () => http.get<Reconciliation>(`/api/metal/reconciliation?month=${month}`),
  });

/** Where a month is read as a sheet or as pages to print. */
export const reconciliationFile = (month: string, kind: 'csv' | 'pdf'): string =>
  `/api/metal/reconciliation.${kind}?month=${month}`;
