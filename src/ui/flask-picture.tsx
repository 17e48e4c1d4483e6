import { useId } from 'react';
import { flaskColours, flaskInk } from './flask-colour.ts';

/** Props of {@link FlaskPicture}. */
export interface FlaskPictureProps {
  /** Temperature that colours the flask, in °C; null when it is not known, and then it is drawn in outline. */
  readonly temperatureC: number | null;
  /** Large words on its side, such as the temperature written out. */
  readonly text?: string;
  /** Small words below them, such as "°C, falling". */
  readonly note?: string;
  /** What the picture says to a screen reader; without it the picture is decoration beside words. */
  readonly label?: string;
  readonly size?: 'row' | 'card' | 'gauge';
}

const sizes = { row: 'h-[76px] w-16', card: 'h-32 w-27', gauge: 'h-full w-full' } as const;
const strokes = { row: 12, card: 9, gauge: 6 } as const;

/** A flask as the cylinder it is, coloured by how hot it is. */
export const FlaskPicture = ({ temperatureC, text, note, label, size = 'row' }: FlaskPictureProps) => {
  const shade = useId();
  const colours = temperatureC === null ? null : flaskColours(temperatureC);
  const line = { className: 'stroke-ink', strokeWidth: strokes[size] } as const;
  return (
    <svg
      viewBox="-108 -152 216 304"
      role={label ? 'img' : undefined}
      aria-label={label}
      aria-hidden={label ? undefined : true}
      className={`shrink-0 ${sizes[size]}`}
    >
      {colours ? (
        <linearGradient id={shade}>
          <stop offset="0" stopColor={colours.edge} />
          <stop offset="0.22" stopColor={colours.body} />
          <stop offset="0.78" stopColor={colours.body} />
          <stop offset="1" stopColor={colours.edge} />
        </linearGradient>
      ) : null}
      <path
        d="M-96 -112 V112 A96 30 0 0 0 96 112 V-112 Z"
        fill={colours ? `url(#${shade})` : 'var(--panel)'}
        strokeLinejoin="round"
        {...line}
      />
      <ellipse cy="-112" rx="96" ry="30" fill={colours?.top ?? 'var(--panel)'} {...line} />
      {size === 'gauge' ? (
        <ellipse
          cy="-112"
          rx="78"
          ry="22"
          fill="none"
          stroke={colours?.edge ?? 'currentColor'}
          strokeWidth="3"
        />
      ) : null}
      <ellipse cy="-111" rx="30" ry="9" fill={flaskInk} />
      <g textAnchor="middle" fill={colours ? flaskInk : 'currentColor'}>
        {text ? (
          <text y="40" className="text-[66px] font-black">
            {text}
          </text>
        ) : null}
        {note ? (
          <text y="80" className="text-[30px] font-extrabold">
            {note}
          </text>
        ) : null}
      </g>
    </svg>
  );
};
