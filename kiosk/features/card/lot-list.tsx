import { lotKindNames } from '#shared/domain/metal/lot.ts';
import type { ChargeLineState } from '#shared/domain/pour-card/charge-lines.ts';
import { StateMark } from '#src/ui/state-mark.tsx';
import { splitFigure, type UnitWriter } from '#kiosk/lib/unit-writer.ts';

/** Props of {@link LotList}. */
export interface LotListProps {
  readonly lines: readonly ChargeLineState[];
  readonly write: UnitWriter;
  readonly onChoose: (code: string) => void;
}

const marks = {
  done: { state: 'ready', text: 'in' },
  next: { state: 'wait', text: 'next' },
  'to-come': null,
  over: { state: 'caution', text: 'over' },
} as const;

const row = 'flex items-center justify-between gap-2 leading-[1.12] whitespace-nowrap';

const massOf = ({ inG, toGoG, plannedG }: ChargeLineState, write: UnitWriter): string => {
  const wantedG = toGoG > 0 ? inG + toGoG : plannedG;
  if (wantedG === 0) return write.mass(inG);
  return inG === 0 ? write.mass(wantedG) : `${splitFigure(write.mass(inG)).figure} of ${write.mass(wantedG)}`;
};

/** The lots of a charge, one under the other: what is in of each and what is wanted; each is chosen by a touch. */
export const LotList = ({ lines, write, onChoose }: LotListProps) => (
  <ul aria-label="Lots of this charge" className="grid min-h-0 content-start gap-4 overflow-y-auto p-1">
    {lines.map((line) => {
      const mark = marks[line.state];
      return (
        <li key={line.lotId} className="grid">
          <button
            type="button"
            onClick={() => onChoose(line.code)}
            className={`grid min-h-18 touch-manipulation content-center rounded-2xl border-[3px] px-3 py-1 text-left select-none ${
              line.state === 'next' ? 'border-ink bg-panel' : 'border-line'
            }`}
          >
            <span className={row}>
              <span className="text-2xl font-black">{line.code}</span>
              <span className="text-xl font-extrabold">{massOf(line, write)}</span>
            </span>
            <span className={row}>
              <span className="text-xl text-soft">{lotKindNames[line.kind]}</span>
              {mark ? <StateMark state={mark.state} text={mark.text} size="desk" /> : null}
            </span>
            {line.name === '' ? null : (
              <span className="truncate text-xl leading-[1.12] text-soft">{line.name}</span>
            )}
          </button>
        </li>
      );
    })}
  </ul>
);
