import { Link } from 'react-router-dom';
import { buttonClass } from '#src/ui/button-class.ts';
import { controlClass } from '#src/ui/control-class.ts';
import { Icon } from '#src/ui/icon.tsx';

/** Props of {@link DayPicker}. */
export interface DayPickerProps {
  readonly day: string;
  readonly before: string;
  readonly after: string;
  readonly today: string;
  readonly onPick: (day: string) => void;
}

const step = buttonClass({ kind: 'plain' }, '!min-h-[46px] !px-3');

/** Goes to the day before, the day after, any day, and back to today; the day stands in the address. */
export const DayPicker = ({ day, before, after, today, onPick }: DayPickerProps) => (
  <div className="flex flex-wrap items-center gap-2">
    <Link to={`?on=${before}`} className={step} aria-label="The day before">
      <Icon name="back" />
    </Link>
    <input
      type="date"
      aria-label="Day"
      value={day}
      onChange={(event) => {
        if (event.target.value) onPick(event.target.value);
      }}
      className={`${controlClass} !w-[11.5rem] font-extrabold`}
    />
    <Link to={`?on=${after}`} className={step} aria-label="The day after">
      <Icon name="forward" />
    </Link>
    {day === today ? null : (
      <Link to="/" className={buttonClass({ kind: 'quiet' })}>
        Back to today
      </Link>
    )}
  </div>
);
