import { useQuery } from '@tanstack/react-query';
import { flasksQuery } from '#src/api/castings.ts';
import { Loaded } from '../../parts/loaded.tsx';
import { FlaskPlate } from './flask-plate.tsx';
import { PrintFrame } from './print-frame.tsx';

const advice =
  'Four plates across on A4, each 40 × 40 mm between its cutting lines. Print at 100 %, not fitted to the page.';

/** The plates of all flasks on sheets of A4, with lines to cut along. */
export const PlateSheetPage = () => {
  const flasks = useQuery(flasksQuery);
  return (
    <PrintFrame title="All plates" advice={advice} backTo="/flasks" backName="All flasks">
      <Loaded query={flasks} what="the flasks">
        {(list) => (
          <ul className="paper flex w-full max-w-[186mm] flex-wrap gap-[5mm] [page:plate-sheet] not-print:p-[6mm] not-print:max-w-[198mm]">
            {list.map(({ id, code }) => (
              <li key={id} className="break-inside-avoid outline-[0.2mm] outline-line">
                <FlaskPlate code={code} />
              </li>
            ))}
          </ul>
        )}
      </Loaded>
    </PrintFrame>
  );
};
