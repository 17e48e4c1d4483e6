import { useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { parseFlaskCode } from '#shared/lib/codes.ts';
import { flasksQuery } from '#src/api/castings.ts';
import { Notice } from '#src/ui/notice.tsx';
import { Loaded } from '../../parts/loaded.tsx';
import { FlaskPlate } from './flask-plate.tsx';
import { PrintFrame } from './print-frame.tsx';

const advice =
  'The plate is 40 × 40 mm; each module of its code is 1 mm. Print at 100 %, not fitted to the page, and scan it once before it is engraved.';

/** The plate of one flask on a page of its own size. */
export const FlaskPlatePage = () => {
  const { code = '' } = useParams();
  const flasks = useQuery(flasksQuery);
  const read = parseFlaskCode(code);
  return (
    <PrintFrame title={`Plate ${code}`} advice={advice} backTo="/flasks" backName="All flasks">
      {read.ok ? (
        <Loaded query={flasks} what="the flasks">
          {(list) =>
            list.some((flask) => flask.code === read.value) ? (
              <div className="w-fit outline-1 outline-line [page:flask-plate] print:outline-none">
                <FlaskPlate code={read.value} />
              </div>
            ) : (
              <Notice kind="error" title="The studio has no flask of that code." />
            )
          }
        </Loaded>
      ) : (
        <Notice kind="error" title={read.error} />
      )}
    </PrintFrame>
  );
};
