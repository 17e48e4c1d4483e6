import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type { z } from 'zod';
import type {
  AmendLotRequest,
  CountLotRequest,
  dispatchLotRequest,
  Lot,
  LotDetail,
  ReceiveLotRequest,
  releaseLotRequest,
} from '#shared/contracts/lot.ts';
import { http } from '#src/lib/http.ts';

/** The lots with metal on hand, or those that are used up; the oldest first. */
export const lotsQuery = (onHand: 'yes' | 'no') =>
  queryOptions({
    queryKey: ['lots', { onHand }],
    queryFn: () => http.get<Lot[]>(`/api/lots?onHand=${onHand}`),
  });

/** Looks up what the label of a lot says, scanned or typed; rejects with the reason in one sentence. */
export const findLot = (code: string): Promise<Lot> =>
  http.get(`/api/lots/by-code?code=${encodeURIComponent(code)}`);

/** One lot with its papers, its amendments and where its metal went. */
export const lotQuery = (id: string) =>
  queryOptions({ queryKey: ['lots', id], queryFn: () => http.get<LotDetail>(`/api/lots/${id}`) });

const useLotChange = <Request, Answer extends Lot>(send: (request: Request) => Promise<Answer>) => {
  const client = useQueryClient();
  return useMutation({
    mutationFn: send,
    onSuccess: () =>
      Promise.all([
        client.invalidateQueries({ queryKey: ['lots'] }),
        client.invalidateQueries({ queryKey: ['metal'] }),
      ]),
  });
};

/** Takes a lot in. */
export const useReceiveLot = () =>
  useLotChange((request: ReceiveLotRequest) => http.post<Lot>('/api/lots', request));

/** Amends a lot: a new assay, a quarantine, another place. */
export const useAmendLot = (id: string) =>
  useLotChange((request: AmendLotRequest) => http.post<LotDetail>(`/api/lots/${id}/amendments`, request));

/** Lets a lot out of quarantine. */
export const useReleaseLot = (id: string) =>
  useLotChange((request: z.input<typeof releaseLotRequest>) =>
    http.post<LotDetail>(`/api/lots/${id}/release`, request),
  );

/** Writes down what a lot weighs on the balance. */
export const useCountLot = (id: string) =>
  useLotChange((request: CountLotRequest) => http.post<LotDetail>(`/api/lots/${id}/counts`, request));

/** Sends metal of a lot away to be refined. */
export const useDispatchLot = (id: string) =>
  useLotChange((request: z.input<typeof dispatchLotRequest>) =>
    http.post<LotDetail>(`/api/lots/${id}/dispatches`, request),
  );

/** Where a document of a lot is read. */
export const lotDocumentPath = (lotId: string, documentId: string): string =>
  `/api/lots/${lotId}/documents/${documentId}`;

/** Keeps a certificate or photograph of a lot: a PDF, JPEG, PNG or WebP file of at most 10 MB. */
export const useAddLotDocument = (lotId: string) =>
  useLotChange((file: File) =>
    http.upload<LotDetail>(
      `/api/lots/${lotId}/documents?name=${encodeURIComponent(file.name.slice(-120))}`,
      file,
    ),
  );
