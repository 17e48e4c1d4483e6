import { safetyPictures, type SafetySignName } from './safety-pictures.tsx';

export type { SafetySignName };

/** Props of {@link SafetySign}. */
export interface SafetySignProps {
  readonly sign: SafetySignName;
  /** Utility classes for its size. */
  readonly className?: string;
}

/** ISO 3864 colours: signal blue for what must be done, signal yellow for a warning. */
const colours = { blue: '#0B4F8F', yellow: '#F4B400', white: '#F8F4EC', black: '#1A1613' } as const;

const Mandatory = () => <circle r="60" fill={colours.blue} stroke={colours.white} strokeWidth="2.5" />;

const triangle = 'M0 -51 L56 46 H-56 Z';

// The light edge keeps the black border in sight on the dark ground of the melt room.
const Warning = () => (
  <g strokeLinejoin="round">
    <path d={triangle} fill="none" stroke={colours.white} strokeWidth="15" />
    <path d={triangle} fill={colours.yellow} stroke={colours.black} strokeWidth="10" />
  </g>
);

/** A safety sign in the shape and colour of ISO 3864, with a picture of our own; its name is read out. */
export const SafetySign = ({ sign, className = 'size-28' }: SafetySignProps) => {
  const { kind, name, picture } = safetyPictures[sign];
  const colour = kind === 'mandatory' ? colours.white : colours.black;
  return (
    <svg
      viewBox="-64 -64 128 128"
      role="img"
      aria-label={name}
      className={`shrink-0 ${className}`}
      data-kind={kind}
    >
      {kind === 'mandatory' ? <Mandatory /> : <Warning />}
      <g
        fill={colour}
        stroke={colour}
        color={kind === 'mandatory' ? colours.blue : colours.yellow}
        strokeWidth="5"
        strokeLinecap="round"
        strokeLinejoin="round"
      >
        {picture}
      </g>
    </svg>
  );
};
