import { useQuery } from '@tanstack/react-query';
import { Link, useParams } from 'react-router-dom';
import type { LotDetail } from '#shared/contracts/lot.ts';
import { lotKindNames } from '#shared/domain/metal/lot.ts';
import { lotQuery } from '#src/api/lots.ts';
import { useNow } from '#src/lib/use-now.ts';
import { DefinitionList, type Definition } from '#src/ui/definition-list.tsx';
import { Notice } from '#src/ui/notice.tsx';
import { PageTitle } from '#src/ui/page-title.tsx';
import { StateMark } from '#src/ui/state-mark.tsx';
import { Loaded } from '#src/desk/parts/loaded.tsx';
import { useStudio, type StudioWriting } from '#src/desk/parts/use-studio.ts';
import { capitalised, elementName, writeWt } from '#src/desk/parts/element-names.ts';
import { MarkWords } from '#src/desk/parts/mark-words.tsx';
import { Panel } from '#src/desk/parts/panel.tsx';
import { LotActions } from './lot-actions.tsx';
import { LotDocuments } from './lot-documents.tsx';
import { LotAmendments, LotPath } from './lot-history.tsx';
import { LotMovements } from './lot-movements.tsx';
import { ageWords, finenessOf, finenessWords } from './lot-words.ts';
import { writeExactGrams, writeExactMass } from './metal-mass.ts';

const linkClass = 'underline decoration-2 underline-offset-4';

const originOf = (lot: LotDetail, { clock, units }: StudioWriting, nowMs: number): readonly Definition[] => [
  ...(lot.melt
    ? [
        {
          term: 'Button of',
          value: (
            <Link to={`/melts/${lot.melt.id}`} className={linkClass}>
              {lot.melt.code}
            </Link>
          ),
        },
      ]
    : [
        { term: 'Supplier', value: lot.supplier || 'not said' },
        { term: 'Supplier’s reference', value: lot.supplierReference || 'not said' },
      ]),
  ...(lot.alloy
    ? [
        {
          term: 'Alloy',
          value: (
            <Link to={`/alloys/${lot.alloy.id}`} className={linkClass}>
              {lot.alloy.name}
            </Link>
          ),
        },
      ]
    : []),
  { term: 'Place', value: lot.place || 'not said' },
  { term: 'Came with', value: writeExactGrams(lot.receivedG, units.mass) },
  {
    term: 'Received',
    value: `${clock.dayAndTime(lot.receivedAt)}, ${ageWords(lot.receivedAt, nowMs)}`,
  },
  { term: 'Taken in by', value: lot.receivedBy },
];

const compositionOf = (lot: LotDetail, { units }: StudioWriting): readonly Definition[] =>
  Object.entries(lot.compositionWt)
    .toSorted(([, a], [, b]) => b - a)
    .map(([symbol, wt]) => {
      const tolerance = lot.toleranceWt[symbol];
      return {
        term: capitalised(elementName(symbol)),
        value: `${writeWt(wt)}${tolerance === undefined ? '' : ` ±${writeWt(tolerance)}`} wt%`,
        note: `${writeExactMass(lot.contentsMg[symbol] ?? 0, units.mass)} ${units.mass}`,
      };
    });

const Summary = ({ lot }: { readonly lot: LotDetail }) => {
  const fineness = finenessOf(lot);
  return (
    <>
      {capitalised(lotKindNames[lot.kind])}
      {fineness ? `, ${finenessWords(fineness)}` : ''}.
    </>
  );
};

const LotMark = ({ lot }: { readonly lot: LotDetail }) => {
  const fineness = finenessOf(lot);
  return fineness ? <MarkWords metal={fineness.metal} worstPpt={fineness.worst} /> : null;
};

const LotView = ({ lot }: { readonly lot: LotDetail }) => {
  const studio = useStudio();
  const nowMs = useNow(60_000);
  return (
    <>
      <PageTitle
        title={`${lot.code} ${lot.name}`}
        mark={lot.quarantineReason === null ? null : <StateMark state="stop" text="in quarantine" />}
        summary={<Summary lot={lot} />}
      />
      <p className="pb-5 text-[34px] leading-tight font-black">
        {writeExactGrams(lot.balanceG, studio.units.mass)}{' '}
        <span className="text-[20px] font-extrabold text-soft">on hand</span>
      </p>
      <LotActions lot={lot} />
      {lot.quarantineReason === null ? null : (
        <div className="max-w-3xl pb-9">
          <Notice kind="caution" title="It must not be used.">
            {lot.quarantineReason}
          </Notice>
        </div>
      )}
      <div className="grid gap-x-14 gap-y-12 lg:grid-cols-2">
        <Panel title="What it holds">
          <DefinitionList items={compositionOf(lot, studio)} />
          <LotMark lot={lot} />
        </Panel>
        <Panel title="Where it is from">
          <DefinitionList items={originOf(lot, studio, nowMs)} />
        </Panel>
        <div className="lg:col-span-2">
          <Panel title="Movements">
            <LotMovements lotId={lot.id} />
          </Panel>
        </div>
        <Panel title="Documents">
          <LotDocuments lot={lot} />
        </Panel>
        <div className="grid content-start gap-12">
          <Panel title="Melts it went into">
            <LotPath lot={lot} />
          </Panel>
          <Panel title="What was changed">
            <LotAmendments lot={lot} />
          </Panel>
        </div>
      </div>
    </>
  );
};

/** One lot of metal: what is left of it, what it holds, where it is from and where its metal went. */
export const LotPage = () => {
  const { lotId = '' } = useParams();
  const lot = useQuery(lotQuery(lotId));
  return (
    <Loaded query={lot} what="the lot">
      {(found) => <LotView lot={found} />}
    </Loaded>
  );
};
