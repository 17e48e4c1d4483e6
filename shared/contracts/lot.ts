import { z } from 'zod';
import type { Contents } from '#shared/domain/metal/contents.ts';
import type { DocumentType } from '#shared/domain/metal/document-type.ts';
import { lotKinds, type AmendmentKind, type LotKind, type Parts } from '#shared/domain/metal/lot.ts';
import { instant, massG, massOrNoneG, optionalWords, words, type Abilities } from './common.ts';

const symbol = z.string().regex(/^[A-Z][a-z]?$/, 'Use element symbols, such as Ag.');

/** Parts of a lot, wt%; whether they come to a whole is judged with the lot's kind. */
export const lotCompositionWt = z
  .record(symbol, z.number().gt(0, 'Leave out what it does not hold.').max(100, 'Not above 100.'))
  .refine((wt) => Object.keys(wt).length > 0 && Object.keys(wt).length <= 12, 'Give one to twelve elements.');

/** How far each part may be off by the certificate, ± wt%. */
export const lotToleranceWt = z.record(
  symbol,
  z.number().min(0, 'Not below 0.').max(5, 'A tolerance of more than 5 % certifies nothing.'),
);

/** Another person's name to what one person must not do alone: their password at the desk, their PIN at a terminal. */
export const countersign = z.union(
  [
    z.object({
      login: words(60, 'Whose sign-in?'),
      password: z.string().min(1, 'Type the password.').max(200),
    }),
    z.object({ personId: z.uuid(), pin: z.string().regex(/^\d{4,12}$/, 'Type the PIN.') }),
  ],
  { error: 'A second person must sign: their name and password.' },
);
/** Another person's name to an act. */
export type Countersign = z.infer<typeof countersign>;

/** Takes a lot in; `key` is made once, so that sending it again takes nothing in twice. */
export const receiveLotRequest = z.object({
  key: z.uuid(),
  name: words(80, 'Name the lot.'),
  kind: z.enum(lotKinds, { error: 'Choose what kind of metal it is.' }),
  alloyRevisionId: z.uuid().nullable().default(null),
  compositionWt: lotCompositionWt,
  toleranceWt: lotToleranceWt,
  massG,
  supplier: optionalWords(120),
  supplierReference: optionalWords(120),
  place: optionalWords(80),
  receivedAt: instant,
  quarantineReason: optionalWords(500),
  /** The person has seen what is odd about it and stands by it. */
  confirmed: z.boolean().default(false),
});
/** Takes a lot in. */
export type ReceiveLotRequest = z.input<typeof receiveLotRequest>;

/** Amends a lot: a new assay, a quarantine, another place. What was written stays beside it. */
export const amendLotRequest = z.discriminatedUnion('kind', [
  z.object({
    kind: z.literal('assay'),
    compositionWt: lotCompositionWt,
    toleranceWt: lotToleranceWt,
    reason: words(500, 'Say whose assay it is, and its number.'),
  }),
  z.object({ kind: z.literal('quarantined'), reason: words(500, 'Say why it must not be used.') }),
  z.object({
    kind: z.literal('moved'),
    place: words(80, 'Say where it lies now.'),
    reason: optionalWords(500),
  }),
]);
/** Amends a lot. */
export type AmendLotRequest = z.input<typeof amendLotRequest>;

/** Lets a lot out of quarantine. */
export const releaseLotRequest = z.object({ reason: words(500, 'Say why it may be used.') });

/** Counts a lot on the balance; a difference wants an explanation and a second person. */
export const countLotRequest = z.object({
  key: z.uuid(),
  countedG: massOrNoneG,
  explanation: optionalWords(500),
  countersign: countersign.nullable().default(null),
});
/** Counts a lot. */
export type CountLotRequest = z.input<typeof countLotRequest>;

/** Sends metal of a lot away to be refined. */
export const dispatchLotRequest = z.object({
  key: z.uuid(),
  massG,
  reason: words(500, 'Say where it goes.'),
});

const flag = z.enum(['yes', 'no']).optional();

/** Which lots to list; by the oldest first. */
export const listLotsQuery = z.object({
  kind: z.enum(lotKinds).optional(),
  onHand: flag,
  quarantined: flag,
  alloyRevisionId: z.uuid().optional(),
  search: z.string().trim().max(80).optional(),
});

/** The code on a lot's label, scanned or typed. */
export const findLotQuery = z.object({ code: z.string().max(500, 'That is far longer than a lot code.') });

/** The type and name of a document that is sent as the body. */
export const addDocumentQuery = z.object({ name: words(120, 'Name the document.') });

/** A lot of metal. */
export interface Lot {
  readonly id: string;
  readonly code: string;
  readonly name: string;
  readonly kind: LotKind;
  readonly alloy: { readonly id: string; readonly name: string; readonly revisionId: string } | null;
  /** The melt whose button it is. */
  readonly melt: { readonly id: string; readonly code: string } | null;
  readonly compositionWt: Parts;
  readonly toleranceWt: Parts;
  readonly supplier: string;
  readonly supplierReference: string;
  readonly place: string;
  readonly quarantineReason: string | null;
  readonly receivedG: number;
  readonly balanceG: number;
  readonly contentsMg: Contents;
  readonly receivedAt: string;
  readonly receivedBy: string;
  readonly abilities: Abilities<'amend' | 'release' | 'count' | 'dispatch'>;
}

/** A certificate or photograph of a lot. */
export interface LotDocument {
  readonly id: string;
  readonly name: string;
  readonly mediaType: DocumentType;
  readonly bytes: number;
  readonly sha256: string;
  readonly person: string;
  readonly at: string;
}

/** What was found out or decided about a lot later. */
export interface LotAmendment {
  readonly kind: AmendmentKind;
  readonly compositionWt: Parts | null;
  readonly toleranceWt: Parts | null;
  readonly place: string | null;
  readonly reason: string;
  readonly person: string;
  readonly at: string;
}

/** One lot with its papers, its amendments and where its metal went. */
export interface LotDetail extends Lot {
  readonly documents: readonly LotDocument[];
  readonly amendments: readonly LotAmendment[];
  /** The melts its metal went into, oldest first. */
  readonly melts: readonly { readonly id: string; readonly code: string; readonly massG: number }[];
  /** Lots made of the buttons of those melts. */
  readonly becameLots: readonly { readonly id: string; readonly code: string; readonly name: string }[];
}
