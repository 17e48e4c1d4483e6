import type { Instrument, InstrumentReading } from '#shared/contracts/instrument.ts';
import { fixedPointData } from '#shared/domain/instrument/fixed-point.ts';
import { instrumentKindNames } from '#shared/domain/instrument/instrument.ts';
import type { CheckDue } from '#shared/domain/instrument/pyrometer-check.ts';
import { Notice } from '#src/ui/notice.tsx';
import { StateMark, type State } from '#src/ui/state-mark.tsx';
import { useStudio } from '#src/desk/parts/use-studio.ts';
import { CheckForm } from './check-form.tsx';
import { EndInstrument } from './end-instrument.tsx';
import { offsetWords, readingWords } from './instrument-words.ts';

const dueStates: Readonly<Record<CheckDue['state'], State>> = {
  never: 'caution',
  'in-date': 'ready',
  due: 'wait',
  overdue: 'stop',
};

const Line = ({ label, children }: { readonly label: string; readonly children: React.ReactNode }) => (
  <div className="grid gap-x-4 sm:grid-cols-[140px_minmax(0,1fr)]">
    <dt className="font-extrabold text-soft">{label}</dt>
    <dd>{children}</dd>
  </div>
);

const Reading = ({ reading }: { readonly reading: InstrumentReading | null }) => {
  const { clock, units } = useStudio();
  if (!reading) return <span className="text-soft">none sent yet</span>;
  return (
    <>
      <span className="font-extrabold">{readingWords(reading, units.temperature)}</span>{' '}
      <span className="text-soft">{clock.dayAndTime(reading.takenAt)}</span>
    </>
  );
};

const Check = ({ instrument: { lastCheck, due, active } }: { readonly instrument: Instrument }) => {
  const { clock } = useStudio();
  if (!due) return <span className="text-soft">not checked against freezing points</span>;
  return (
    <div className="grid gap-1">
      {lastCheck ? (
        <span>
          <span className="font-extrabold">offset {offsetWords(lastCheck.offsetC)}</span>,{' '}
          {fixedPointData[lastCheck.point].name}, {clock.dayAndTime(lastCheck.checkedAt)}, {lastCheck.person}
        </span>
      ) : null}
      {lastCheck ? <span className="max-w-[60ch] text-[15px] text-soft">{lastCheck.sentence}</span> : null}
      {active ? <StateMark state={dueStates[due.state]} text={due.sentence} size="row" /> : null}
    </div>
  );
};

const Card = ({ instrument }: { readonly instrument: Instrument }) => {
  const { clock } = useStudio();
  const { name, kind, thermocouple, terminal, active, revokedAt, abilities } = instrument;
  const what = thermocouple === null ? instrumentKindNames[kind] : `thermometer, type ${thermocouple}`;
  return (
    <li className="grid gap-3 break-inside-avoid border-t-2 border-line py-5">
      <div className="flex flex-wrap items-center justify-between gap-3">
        <h3 className="text-[19px] font-black">{name}</h3>
        <div className="screen-only flex flex-wrap gap-3">
          {abilities.check ? <CheckForm instrument={instrument} /> : null}
          {abilities.revoke ? <EndInstrument instrument={instrument} /> : null}
        </div>
      </div>
      <dl className="grid gap-2">
        <Line label="What it is">
          {what}
          {terminal ? `, at ${terminal.name}, ${terminal.bay}` : ''}
        </Line>
        <Line label="Last reading">
          <Reading reading={instrument.lastReading} />
        </Line>
        <Line label="Check">
          <Check instrument={instrument} />
        </Line>
        {active ? null : <Line label="State">ended {revokedAt ? clock.dayAndTime(revokedAt) : ''}</Line>}
      </dl>
    </li>
  );
};

/** The instruments one by one: last reading, check with its offset, and when the next is due. */
export const InstrumentList = ({ instruments }: { readonly instruments: readonly Instrument[] }) =>
  instruments.length === 0 ? (
    <Notice kind="empty" title="No instrument has been entered yet.">
      A thermometer’s line format and how a logger sends its readings are described in docs/instruments.md.
    </Notice>
  ) : (
    <ul className="grid border-b-2 border-line" aria-label="Instruments">
      {instruments.map((instrument) => (
        <Card key={instrument.id} instrument={instrument} />
      ))}
    </ul>
  );
