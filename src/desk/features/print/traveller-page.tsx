import { useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { castingsQuery } from '#src/api/castings.ts';
import { Notice } from '#src/ui/notice.tsx';
import { Loaded } from '../../parts/loaded.tsx';
import { PrintFrame } from './print-frame.tsx';
import { TravellerCard } from './traveller-card.tsx';

const advice =
  'A card of A6 that hangs at the furnace with the flask. Print at 100 %. Its figures are those of this moment; the terminal’s card decides.';

/** The traveller card of a casting that is still in its flask. */
export const TravellerPage = () => {
  const { castingId = '' } = useParams();
  const castings = useQuery(castingsQuery());
  return (
    <PrintFrame title="Traveller card" advice={advice} backTo="/" backName="Today">
      <Loaded query={castings} what="the casting">
        {(list) => {
          const casting = list.find(({ id }) => id === castingId);
          return casting ? (
            <TravellerCard casting={casting} />
          ) : (
            <Notice kind="empty" title="Only a casting that is still in its flask has a traveller card.">
              This one has been broken out, was scrapped, or never was.
            </Notice>
          );
        }}
      </Loaded>
    </PrintFrame>
  );
};
