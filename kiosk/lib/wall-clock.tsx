import { format } from 'date-fns';

/** The time of day in figures that are read across the room, with the day and the place below. */
export const WallClock = ({ nowMs, place }: { readonly nowMs: number; readonly place: string }) => {
  const now = new Date(nowMs);
  return (
    <div>
      <time
        dateTime={format(now, 'HH:mm')}
        className="block [zoom:calc(1/var(--zoom,1))] text-[148px] leading-[0.86] font-black tracking-[-0.04em]"
      >
        {format(now, 'HH:mm')}
      </time>
      <p className="mt-4 text-2xl text-soft">
        {format(now, 'EEE d MMM')} · {place}
      </p>
    </div>
  );
};
