import type { PourCard } from '#shared/contracts/card.ts';
import { markedMetal } from '#shared/domain/alloy/alloy-family.ts';
import { splitCode } from '#shared/lib/codes.ts';
import { timeOfDay } from '#src/lib/formats.ts';
import { AlloyChip } from '#src/ui/alloy-chip.tsx';
import { useServerNow } from '#kiosk/lib/server-clock.ts';
import type { UnitWriter } from '#kiosk/lib/unit-writer.ts';
import { PhotographBadge } from '#kiosk/outbox/photograph-badge.tsx';
import { WaitingBadge } from '#kiosk/outbox/waiting-badge.tsx';

/** The strip that names the flask: code, alloy, metal, method, time of day, and what waits for the server. */
export const CardTop = ({ card, write }: { readonly card: PourCard; readonly write: UnitWriter }) => {
  const { flask, alloy, method, tree } = card.casting;
  const code = splitCode(flask.code);
  const now = new Date(useServerNow()).toISOString();
  return (
    <>
      <span className="text-[40px] leading-none font-black text-ink">
        {code.main}
        <span className="ml-2 text-2xl text-soft">{code.check}</span>
      </span>
      <AlloyChip
        name={alloy.name}
        fineness={String(alloy.fineness)}
        metal={markedMetal(alloy.family) === 'Ag' ? 'silver' : 'gold'}
        size="terminal"
      />
      <span className="portrait:hidden">
        {write.mass(card.context.plannedMetalG)} · {method} · {tree.thinnestSectionMm} mm
      </span>
      <time dateTime={timeOfDay(now)} className="font-extrabold">
        {timeOfDay(now)}
      </time>
      <WaitingBadge />
      <PhotographBadge />
    </>
  );
};
