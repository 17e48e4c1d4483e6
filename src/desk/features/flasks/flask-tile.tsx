import { Link } from 'react-router-dom';
import type { Casting } from '#shared/contracts/casting.ts';
import type { Flask } from '#shared/contracts/flask.ts';
import { splitCode } from '#shared/lib/codes.ts';
import { AlloyChip } from '#src/ui/alloy-chip.tsx';
import { CastingStateMark } from '../../parts/casting-state-mark.tsx';
import { FlaskCodePicture } from '../../parts/flask-code-picture.tsx';
import { FlaskCodeText } from '../../parts/flask-code-text.tsx';
import { metalOf } from '../../parts/metal-of.ts';

/** Props of {@link FlaskTile}. */
export interface FlaskTileProps {
  readonly flask: Flask;
  /** The open casting in it, once the castings are read. */
  readonly casting: Casting | undefined;
  readonly onEnlarge: () => void;
}

const link = 'rounded-md font-extrabold underline decoration-2 underline-offset-4';

const Contents = ({ flask, casting }: Omit<FlaskTileProps, 'onEnlarge'>) => {
  if (flask.openCastingId === null) return <p className="font-extrabold text-soft">free</p>;
  if (!casting) return <p className="text-soft">in use</p>;
  return (
    <div className="grid justify-items-start gap-1">
      <AlloyChip
        name={casting.alloy.name}
        fineness={String(casting.alloy.fineness)}
        metal={metalOf(casting.alloy.family)}
      />
      <CastingStateMark state={casting.state} />
    </div>
  );
};

/** One flask: its code large enough to scan from the screen, what is in it, and the way to its plate. */
export const FlaskTile = ({ flask, casting, onEnlarge }: FlaskTileProps) => {
  const { main } = splitCode(flask.code);
  return (
    <li className="grid grid-cols-[160px_minmax(0,1fr)] gap-5 border-t-2 border-line py-5">
      <button
        type="button"
        onClick={onEnlarge}
        aria-label={`Show the code of ${main} large`}
        className="self-start rounded-lg"
      >
        <FlaskCodePicture code={flask.code} className="w-[160px] rounded-lg" />
      </button>
      <div className="grid content-start gap-2">
        <h2 className="text-[22px] font-black">
          <FlaskCodeText code={flask.code} />
        </h2>
        <p className="text-soft">
          {flask.diameterMm} × {flask.heightMm} mm
        </p>
        <Contents flask={flask} casting={casting} />
        <p className="flex flex-wrap gap-x-4">
          <Link to={`/print/flasks/${flask.code}`} className={link}>
            Plate<span className="sr-only"> of {main}</span>
          </Link>
          {casting ? (
            <Link to={`/print/castings/${casting.id}`} className={link}>
              Traveller card<span className="sr-only"> of {main}</span>
            </Link>
          ) : null}
        </p>
      </div>
    </li>
  );
};
