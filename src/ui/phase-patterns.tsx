/** Fills that tell the phases apart in greyscale: `url(#<id>-solid)` hatched, `url(#<id>-mushy)` dotted. */
export const PhasePatterns = ({ id }: { readonly id: string }) => (
  <defs>
    <pattern
      id={`${id}-solid`}
      width="12"
      height="12"
      patternUnits="userSpaceOnUse"
      patternTransform="rotate(45)"
    >
      <rect width="12" height="12" className="fill-iron-soft" />
      <rect width="4" height="12" className="fill-iron" />
    </pattern>
    <pattern id={`${id}-mushy`} width="14" height="14" patternUnits="userSpaceOnUse">
      <rect width="14" height="14" className="fill-ember-soft" />
      <circle cx="3.5" cy="3.5" r="3" className="fill-iron" />
      <circle cx="10.5" cy="10.5" r="2.4" className="fill-iron" />
    </pattern>
  </defs>
);
