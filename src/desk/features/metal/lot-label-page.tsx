import { useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import type { LotDetail } from '#shared/contracts/lot.ts';
import { lotKindNames } from '#shared/domain/metal/lot.ts';
import { splitCode } from '#shared/lib/codes.ts';
import { lotQuery } from '#src/api/lots.ts';
import { FlaskCodePicture } from '#src/desk/parts/flask-code-picture.tsx';
import { Loaded } from '#src/desk/parts/loaded.tsx';
import { useStudio } from '#src/desk/parts/use-studio.ts';
import { writeComposition } from '#src/desk/parts/element-names.ts';
import { PrintFrame } from '#src/desk/parts/print-frame.tsx';
import './lot-label.css';

const advice =
  'The label is 70 × 36 mm; each module of its code is 1 mm. Print at 100 %, not fitted to the page, and scan it once before it is stuck on.';

/** A label of exactly 70 × 36 mm: the code in modules of 1 mm with its quiet zone, its number, and what the lot is. */
const LotLabel = ({ lot }: { readonly lot: LotDetail }) => {
  const { clock } = useStudio();
  const { main, check } = splitCode(lot.code);
  return (
    <div className="w-fit outline-1 outline-line [page:lot-label] print:outline-none">
      <article
        aria-label={`Label of ${lot.code}`}
        className="paper flex h-[36mm] w-[70mm] items-center gap-[1mm] overflow-hidden py-[3mm] pr-[3mm] pl-[2mm]"
      >
        <FlaskCodePicture code={lot.code} className="w-[29mm] shrink-0" />
        <div className="grid min-w-0 gap-[0.8mm]">
          <p className="text-[7mm] leading-none font-black whitespace-nowrap">
            {main}
            <span className="text-[4.5mm]">-{check}</span>
          </p>
          <p className="line-clamp-2 text-[3.6mm] leading-[1.15] font-black break-words">{lot.name}</p>
          <p className="line-clamp-3 text-[2.9mm] leading-[1.2]">
            {lotKindNames[lot.kind]}
            <br />
            {writeComposition(lot.compositionWt)}
          </p>
          <p className="text-[2.7mm] leading-[1.2]">received {clock.dayOf(Date.parse(lot.receivedAt))}</p>
        </div>
      </article>
    </div>
  );
};

/** The label of one lot on a page of its own size. */
export const LotLabelPage = () => {
  const { lotId = '' } = useParams();
  const lot = useQuery(lotQuery(lotId));
  return (
    <PrintFrame title="Lot label" advice={advice} backTo={`/metal/lots/${lotId}`} backName="The lot">
      <Loaded query={lot} what="the lot">
        {(found) => <LotLabel lot={found} />}
      </Loaded>
    </PrintFrame>
  );
};
