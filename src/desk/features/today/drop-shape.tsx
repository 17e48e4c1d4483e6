/** How a casting's drop is drawn. */
export type DropLook = 'planned' | 'running' | 'poured' | 'held' | 'scrapped';

/** Props of {@link DropShape}. */
export interface DropShapeProps {
  readonly look: DropLook;
  readonly metal: 'gold' | 'silver';
}

const colours = {
  gold: { full: 'fill-brass-fill stroke-brass-fill', open: 'fill-brass-soft stroke-brass-fill' },
  silver: { full: 'fill-silver-fill stroke-silver-fill', open: 'fill-silver-soft stroke-silver-fill' },
} as const;

const drop = 'M0 -23 C10 -7 17 1 17 10 A17 17 0 0 1 -17 10 C-17 1 -10 -7 0 -23Z';

/** Octagon with a bar for a casting on hold, a crossed disc for a scrapped one: shape before colour. */
const Badge = ({ look }: { readonly look: 'held' | 'scrapped' }) => (
  <g transform="translate(13 -11)" className="text-ember">
    <path
      d="M-4.6 -11 H4.6 L11 -4.6 V4.6 L4.6 11 H-4.6 L-11 4.6 V-4.6 Z"
      className="fill-ember stroke-ground"
      strokeWidth="2"
    />
    <path
      d={look === 'held' ? 'M-5 0 H5' : 'M-4 -4 4 4M4 -4 -4 4'}
      className="stroke-ground"
      strokeWidth="3.2"
      strokeLinecap="round"
    />
  </g>
);

/** A casting as a drop: warm for gold, cool for silver; outlined when planned, filled when poured, ringed at the furnace. */
export const DropShape = ({ look, metal }: DropShapeProps) => (
  <svg viewBox="-26 -27 52 58" width="44" height="49" fill="none" aria-hidden="true">
    {look === 'running' ? (
      <path
        d={drop}
        transform="translate(0 1) scale(1.32)"
        className="stroke-ember-fill"
        strokeWidth="3"
        strokeDasharray="5 4"
      />
    ) : null}
    <path
      d={drop}
      className={look === 'poured' ? colours[metal].full : colours[metal].open}
      strokeWidth="3"
      strokeLinejoin="round"
    />
    {look === 'held' || look === 'scrapped' ? <Badge look={look} /> : null}
  </svg>
);
