import type { ChargeLimit } from './charge-model.ts';
import { elementsOf, toleranceOf, type ChargeRequest } from './charge-request.ts';
import type { LotOnHand } from './lot.ts';
import { metalName } from './metal-name.ts';

/** What stands in the way of a charge, in one sentence. */
export const explainLimit = (limit: ChargeLimit, request: ChargeRequest): string => {
  switch (limit.kind) {
    case 'fineness':
      return `At the certificates' lower bounds the lots on hand do not reach ${request.markPpt} parts per thousand of ${metalName(request.markedMetal)}.`;
    case 'returns':
      return `It would take more returns than the studio's ${Math.round(request.returnsShare * 100)} %.`;
    case 'element': {
      const wanted = `${(request.targetWt[limit.element] ?? 0).toFixed(2)} ± ${toleranceOf(request, limit.element)} wt%`;
      const word = limit.side === 'least' ? 'too little' : 'too much';
      return `The lots on hand give ${word} ${metalName(limit.element)} for ${wanted}.`;
    }
  }
};

/** Purest metal one can buy of each element, wt% and ±: four nines of gold and silver, three of the rest. */
const purity = (element: string): { readonly wt: number; readonly tolerance: number } =>
  element === 'Au' || element === 'Ag' ? { wt: 99.99, tolerance: 0.005 } : { wt: 99.9, tolerance: 0.05 };

/** The request with as much fine metal of each of the alloy's elements as could be bought. */
export const withBoughtMetal = (request: ChargeRequest): ChargeRequest => ({
  ...request,
  lots: [
    ...request.lots,
    ...elementsOf({ targetWt: request.targetWt, lots: [] }).map((element): LotOnHand => {
      const { wt, tolerance } = purity(element);
      return {
        id: `bought-${element}`,
        code: '',
        name: `fine ${metalName(element)}`,
        kind: 'fine',
        compositionWt: { [element]: wt },
        toleranceWt: { [element]: tolerance },
        balanceMg: request.wantedMg + (request.overMg ?? 0),
        receivedAt: '9999-12-31T00:00:00.000Z',
        isBought: true,
      };
    }),
  ],
});
