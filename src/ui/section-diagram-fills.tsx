/** What kind of field a fill stands for. */
export type FieldKind = 'liquid' | 'mushy' | 'solid' | 'two-solids' | 'three-phases';

/** Fills that tell the fields apart in greyscale: solid hatched, solid with liquid dotted, liquid plain. */
export const SectionFills = ({ id }: { readonly id: string }) => (
  <defs>
    <pattern
      id={`${id}-solid`}
      width="13"
      height="13"
      patternUnits="userSpaceOnUse"
      patternTransform="rotate(45)"
    >
      <rect width="13" height="13" className="fill-iron-soft" />
      <rect width="3" height="13" className="fill-iron" opacity="0.5" />
    </pattern>
    <pattern
      id={`${id}-two-solids`}
      width="13"
      height="13"
      patternUnits="userSpaceOnUse"
      patternTransform="rotate(45)"
    >
      <rect width="13" height="13" className="fill-ground" />
      <rect width="13" height="13" className="fill-iron-soft" opacity="0.45" />
      <rect width="2.4" height="13" className="fill-iron" opacity="0.26" />
    </pattern>
    <pattern id={`${id}-mushy`} width="15" height="15" patternUnits="userSpaceOnUse">
      <rect width="15" height="15" className="fill-ember-soft" />
      <circle cx="3.75" cy="3.75" r="2.5" className="fill-iron" />
      <circle cx="11.25" cy="11.25" r="2" className="fill-iron" />
    </pattern>
    <pattern id={`${id}-three-phases`} width="11" height="11" patternUnits="userSpaceOnUse">
      <rect width="11" height="11" className="fill-ember-soft" />
      <path d="M0 11 11 0" className="stroke-iron" strokeWidth="2.4" opacity="0.6" />
      <circle cx="3" cy="3" r="2" className="fill-iron" />
    </pattern>
  </defs>
);

/** The `fill` of a field; `id` is that of the {@link SectionFills} in the same picture. */
export const sectionFill = (id: string, kind: FieldKind): string =>
  kind === 'liquid' ? 'var(--ember-soft)' : `url(#${id}-${kind})`;
