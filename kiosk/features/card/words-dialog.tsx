import { Button } from '#src/ui/button.tsx';
import { Dialog } from '#src/ui/dialog.tsx';
import { TextAreaField } from '#src/ui/text-area-field.tsx';

/** Props of {@link WordsDialog}. */
export interface WordsDialogProps {
  readonly title: string;
  readonly label: string;
  /** What the button says that keeps the words. */
  readonly action: string;
  readonly words: string;
  readonly maxLength: number;
  readonly onWords: (words: string) => void;
  readonly onClose: () => void;
}

/** A few words typed over a step, kept as they are typed. */
export const WordsDialog = ({
  title,
  label,
  action,
  words,
  maxLength,
  onWords,
  onClose,
}: WordsDialogProps) => (
  <Dialog
    open
    onClose={onClose}
    title={title}
    size="terminal"
    actions={
      <Button kind="main" size="terminal" className="flex-1" onClick={onClose}>
        {action}
      </Button>
    }
  >
    <TextAreaField
      label={label}
      value={words}
      rows={5}
      maxLength={maxLength}
      onChange={(event) => onWords(event.target.value)}
    />
  </Dialog>
);
