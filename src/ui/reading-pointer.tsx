/** Props of {@link ReadingPointer}. */
export interface ReadingPointerProps {
  /** Left edge of the column the pointer touches. */
  readonly x: number;
  /** Height of the reading. */
  readonly y: number;
  /** Where the needle begins, at the left of the column. */
  readonly needleFrom: number;
}

/** The pointer of the live reading; it glides to a new reading unless motion is unwanted. */
export const ReadingPointer = ({ x, y, needleFrom }: ReadingPointerProps) => (
  <g className="glide" style={{ transform: `translateY(${y}px)` }} data-part="pointer">
    <path d={`M${needleFrom} 0 H${x - 14}`} className="stroke-ink" strokeWidth="5" />
    <path
      d={`M${x + 8} 0 l-26 -15 v30z`}
      className="fill-ink stroke-ground"
      strokeWidth="3"
      strokeLinejoin="round"
    />
  </g>
);
