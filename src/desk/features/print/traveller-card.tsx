import type { Casting } from '#shared/contracts/casting.ts';
import { castingMethodNames } from '#shared/domain/casting/casting-method.ts';
import { splitCode } from '#shared/lib/codes.ts';
import { formatClock } from '#shared/lib/units.ts';
import { useNow } from '#src/lib/use-now.ts';
import { FlaskCodePicture } from '../../parts/flask-code-picture.tsx';
import { quenchWords } from '../../parts/quench-words.ts';
import { useCastingFigures, type CastingFigures } from '../../parts/use-casting-figures.ts';
import { useStudio, type StudioWriting } from '../../parts/use-studio.ts';

interface Row {
  readonly term: string;
  readonly value: string;
}

const castingRows = (casting: Casting, { mass, clock }: StudioWriting): readonly Row[] => [
  { term: 'Pour planned', value: clock.dayAndTime(casting.plannedPourAt) },
  { term: 'Where', value: casting.bay },
  { term: 'Caster', value: casting.caster?.name ?? 'not set' },
  { term: 'Method', value: castingMethodNames[casting.method] },
  { term: 'Metal', value: mass(casting.plannedMetalG) },
];

const figureRows = ({ figures }: CastingFigures, { temperature, degrees }: StudioWriting): readonly Row[] => [
  { term: 'Melt at the pour', value: `${degrees(figures.pourC.low)} to ${temperature(figures.pourC.high)}` },
  { term: 'Flask in the furnace', value: temperature(figures.flaskHoldC) },
  { term: 'Flask at the pour, at least', value: temperature(figures.flaskPourLowC) },
  { term: 'From furnace to pour, at most', value: formatClock(figures.pourWindowS) },
  { term: 'Quench', value: quenchWords(figures.quench) },
];

/** A card of exactly A6 (105 × 148 mm) for one casting: its flask's code, what is poured, how hot, and when. */
export const TravellerCard = ({ casting }: { readonly casting: Casting }) => {
  const writing = useStudio();
  const found = useCastingFigures(casting);
  const printed = writing.clock.dayAndTime(new Date(useNow(60_000)).toISOString());
  const { main, check } = splitCode(casting.flask.code);
  const { alloy, tree, flask } = casting;
  const rows = [...castingRows(casting, writing), ...(found ? figureRows(found, writing) : [])];
  return (
    <article
      aria-label={`Traveller card of ${casting.flask.code}`}
      className="paper grid h-[148mm] w-[105mm] content-start gap-[2.5mm] overflow-hidden p-[6mm] [page:traveller-card] not-print:outline-1 not-print:outline-line"
    >
      <header className="flex items-start justify-between">
        <div>
          <p className="text-[11mm] leading-none font-black whitespace-nowrap">
            {main}
            <span className="text-[6mm]">-{check}</span>
          </p>
          <p className="mt-[2mm] text-[5.6mm] leading-[1.1] font-black">
            {alloy.name} {alloy.fineness}
          </p>
          <p className="mt-[1mm] text-[3.6mm] leading-[1.25]">
            revision {alloy.revision}
            <br />
            tree {tree.code}: {tree.description}, {tree.pieces}
            <br />
            flask {flask.diameterMm} × {flask.heightMm} mm
          </p>
        </div>
        <FlaskCodePicture code={casting.flask.code} className="-mt-[4mm] -mr-[4mm] w-[38mm] shrink-0" />
      </header>
      <dl className="text-[4mm] leading-tight">
        {rows.map(({ term, value }) => (
          <div key={term} className="flex justify-between gap-[3mm] border-t-[0.25mm] border-ink py-[1.7mm]">
            <dt>{term}</dt>
            <dd className="text-right font-black">{value}</dd>
          </div>
        ))}
      </dl>
      <p className="border-t-[0.25mm] border-ink pt-[1.5mm] text-[3.1mm] leading-[1.3]">
        Printed {printed}. The terminal’s card decides. Local codes, the supplier’s sheets and the studio’s
        competent person come first.
      </p>
    </article>
  );
};
