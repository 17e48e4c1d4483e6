const drop = 'M0 -23 C10 -7 17 1 17 10 A17 17 0 0 1 -17 10 C-17 1 -10 -7 0 -23Z';

const drops = [
  { x: 60, length: 18, look: 'fill-silver-fill stroke-silver-fill' },
  { x: 142, length: 70, look: 'fill-brass-fill stroke-brass-fill' },
  { x: 236, length: 34, look: 'fill-brass-fill stroke-brass-fill' },
  { x: 330, length: 92, look: 'fill-silver-soft stroke-silver-fill' },
  { x: 424, length: 26, look: 'fill-brass-soft stroke-brass-fill' },
] as const;

/** A day's pours as the desk draws them: drops of gold and silver under a line, some poured, some to come. Decoration. */
export const HangingDrops = () => (
  <svg viewBox="0 0 490 160" className="w-full max-w-[490px]" fill="none" aria-hidden="true">
    <path d="M4 5 H486" className="stroke-ink" strokeWidth="5" strokeLinecap="round" />
    <path d="M283 5 V156" className="stroke-ink" strokeWidth="3" />
    <path d="M273 1 h20 l-10 13z" className="fill-ink" />
    {drops.map(({ x, length, look }) => (
      <g key={x}>
        <path d={`M${x} 5 v${length}`} className="stroke-soft" strokeWidth="2" />
        <path d={drop} transform={`translate(${x} ${length + 24})`} className={look} strokeWidth="3.5" />
      </g>
    ))}
  </svg>
);
