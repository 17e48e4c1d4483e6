import { Button } from '#src/ui/button.tsx';
import { Notice } from '#src/ui/notice.tsx';
import type { Arranging } from './use-arranging.ts';

/** Props of {@link DraftBar}. */
export interface DraftBarProps {
  readonly isChanged: boolean;
  readonly isBusy: boolean;
  /** How many fields hold something that cannot be stored. */
  readonly fieldFaults: number;
  /** How many points keep the draft from being approved. */
  readonly stepFaults: number;
  /** The server's sentence when it refused. */
  readonly problem: string | null;
  /** Given when someone else changed the draft meanwhile: reads theirs, and drops what was typed. */
  readonly onLoadAgain: (() => void) | null;
  readonly onUndoAll: () => void;
  readonly arranging: Arranging;
}

const points = (count: number): string => (count === 1 ? '1 point' : `${count} points`);

const standing = ({ isChanged, fieldFaults, stepFaults }: DraftBarProps): string => {
  if (fieldFaults > 0) return `${points(fieldFaults)} to be mended before it can be stored.`;
  const state = isChanged ? 'Not stored yet.' : 'Stored as a draft; nobody works by it yet.';
  return stepFaults > 0 ? `${state} ${points(stepFaults)} to be mended before it can be approved.` : state;
};

/** The foot of the draft: stores it, takes back what was removed, and says what stands in the way. */
export const DraftBar = (props: DraftBarProps) => {
  const { isChanged, isBusy, fieldFaults, problem, onLoadAgain, onUndoAll, arranging } = props;
  return (
    <div className="sticky bottom-0 z-10 grid gap-3 border-t-[3px] border-ink bg-ground py-3">
      {problem ? (
        <Notice
          kind="error"
          title={problem}
          action={
            onLoadAgain ? <Button onClick={onLoadAgain}>Load the stored draft, drop mine</Button> : undefined
          }
        />
      ) : null}
      {arranging.removed ? (
        <p className="flex flex-wrap items-center gap-3">
          <span>“{arranging.removed.step.sentence || 'A new step'}” was removed.</span>
          <Button id="undo-remove" onClick={arranging.undoRemove}>
            Put it back
          </Button>
        </p>
      ) : null}
      <div className="flex flex-wrap items-center gap-4">
        <Button type="submit" kind={fieldFaults > 0 ? 'blocked' : 'main'} busy={isBusy}>
          Store the draft
        </Button>
        {isChanged ? <Button onClick={onUndoAll}>Undo my changes</Button> : null}
        <p role="status" className="font-extrabold text-soft">
          {standing(props)}
        </p>
        <p role="status" className="sr-only">
          {arranging.said}
        </p>
      </div>
    </div>
  );
};
