import { splitCode } from '#shared/lib/codes.ts';

/** A code with its check digit small, as it is engraved. */
export const FlaskCodeText = ({ code }: { readonly code: string }) => {
  const { main, check } = splitCode(code);
  return (
    <span className="whitespace-nowrap">
      {main}
      <span className="text-[0.72em]">-{check}</span>
    </span>
  );
};
