import { splitCode } from '#shared/lib/codes.ts';
import { FlaskCodePicture } from '../../parts/flask-code-picture.tsx';

/** A plate of exactly 40 × 40 mm for engraving: the code in modules of 1 mm with its quiet zone, and its number to read. */
export const FlaskPlate = ({ code }: { readonly code: string }) => {
  const { main, check } = splitCode(code);
  return (
    <div className="paper grid h-[40mm] w-[40mm] content-start justify-items-center overflow-hidden pt-[0.5mm]">
      <FlaskCodePicture code={code} className="w-[29mm]" />
      <p className="-mt-[0.5mm] text-[8mm] leading-[9mm] font-black whitespace-nowrap">
        {main}
        <span className="text-[5.5mm]">-{check}</span>
      </p>
    </div>
  );
};
