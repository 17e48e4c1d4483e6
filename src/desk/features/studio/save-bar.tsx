import { Button } from '#src/ui/button.tsx';
import { Notice } from '#src/ui/notice.tsx';

/** Props of {@link SaveBar}. */
export interface SaveBarProps {
  readonly isChanged: boolean;
  readonly isBusy: boolean;
  readonly wasStored: boolean;
  /** How many fields have something wrong. */
  readonly faults: number;
  /** The server's sentence for the form as a whole. */
  readonly problem: string | undefined;
  /** Given when someone else stored other settings meanwhile: reads those, and drops what was typed. */
  readonly onLoadAgain: (() => void) | null;
  readonly onUndo: () => void;
}

/** The foot of the settings: stores them, and says what stands in the way. */
export const SaveBar = ({
  isChanged,
  isBusy,
  wasStored,
  faults,
  problem,
  onLoadAgain,
  onUndo,
}: SaveBarProps) => (
  <div className="sticky bottom-0 z-10 grid gap-4 border-t-[3px] border-ink bg-ground py-4">
    {problem ? (
      <Notice
        kind="error"
        title={problem}
        action={
          onLoadAgain ? <Button onClick={onLoadAgain}>Load the stored settings, drop mine</Button> : undefined
        }
      />
    ) : null}
    <div className="flex flex-wrap items-center gap-4">
      <Button type="submit" kind="main" busy={isBusy}>
        Store the settings
      </Button>
      {isChanged ? <Button onClick={onUndo}>Undo my changes</Button> : null}
      <p role="status" className="font-extrabold text-soft">
        {faults > 0
          ? `${faults} ${faults === 1 ? 'field needs' : 'fields need'} another look.`
          : isChanged
            ? 'Not stored yet.'
            : wasStored
              ? 'Stored. Cards opened from now on use these settings.'
              : 'Cards already open keep what they began with.'}
      </p>
    </div>
  </div>
);
