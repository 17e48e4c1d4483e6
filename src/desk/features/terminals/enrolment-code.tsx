import { useState } from 'react';
import type { Enrolment } from '#shared/contracts/terminal.ts';
import { formatClock } from '#shared/lib/units.ts';
import { useNow } from '#src/lib/use-now.ts';
import { Button } from '#src/ui/button.tsx';

/** Props of {@link EnrolmentCode}. */
export interface EnrolmentCodeProps {
  readonly enrolment: Enrolment;
  readonly onAnother: () => void;
}

/** A fresh enrolment code, large, with the time it is good for; it is shown this once. */
export const EnrolmentCode = ({ enrolment, onAnother }: EnrolmentCodeProps) => {
  const now = useNow(1000);
  const [madeAt] = useState(now);
  const expires = Date.parse(enrolment.expiresAt);
  const leftS = Math.max(0, (expires - now) / 1000);
  const share = leftS / Math.max(1, (expires - madeAt) / 1000);
  const { code } = enrolment;
  return (
    <section
      aria-labelledby="code"
      className="grid gap-4 rounded-[22px] border-2 border-line bg-panel px-6 py-6"
    >
      <h2 id="code" className="text-[21px] font-black">
        Code for {enrolment.name}
      </h2>
      {leftS > 0 ? (
        <>
          <p className="text-[58px] leading-none font-black tracking-wide whitespace-nowrap" data-part="code">
            {code.slice(0, 4)} {code.slice(4)}
          </p>
          <div className="h-2 overflow-hidden rounded-full bg-line" aria-hidden="true">
            <div className="h-full bg-ink" style={{ width: `${share * 100}%` }} />
          </div>
          <p role="timer" className="font-extrabold">
            Good for {formatClock(leftS)}, once.
          </p>
          <p className="text-soft">
            On the device open <span className="font-extrabold text-ink">{window.location.origin}/kiosk</span>{' '}
            and type the code. It is shown only here and now.
          </p>
        </>
      ) : (
        <p className="font-extrabold">This code’s time is over.</p>
      )}
      <p>
        <Button onClick={onAnother}>Make another code</Button>
      </p>
    </section>
  );
};
