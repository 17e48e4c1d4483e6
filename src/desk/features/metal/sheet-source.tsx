import { useId, useRef, useState, type DragEvent } from 'react';
import { TextAreaField } from '#src/ui/text-area-field.tsx';
import { Button } from '#src/ui/button.tsx';
import { FieldError } from '#src/ui/field.tsx';
import { cx } from '#src/ui/cx.ts';
import { Disclosure } from '#src/desk/parts/panel.tsx';
import { readSheetFile } from './read-sheet-file.ts';

/** Props of {@link SheetSource}. */
export interface SheetSourceProps {
  /** The sheet that is looked through now, as text; empty before the first. */
  readonly text: string;
  readonly isBusy: boolean;
  readonly onSheet: (text: string, remark: string) => void;
}

const Paste = ({ text, isBusy, onSheet }: SheetSourceProps) => {
  const area = useRef<HTMLTextAreaElement>(null);
  return (
    <Disclosure summary={text === '' ? 'Paste it as text' : 'Mend it as text'}>
      <div className="grid max-w-4xl gap-3">
        <TextAreaField
          key={text}
          ref={area}
          label="The sheet as text"
          hint="Its first line names the columns; semicolons, commas or tabs stand between the cells."
          rows={8}
          wrap="off"
          spellCheck={false}
          defaultValue={text}
        />
        <p>
          <Button busy={isBusy} onClick={() => onSheet(area.current?.value ?? '', '')}>
            Look it through
          </Button>
        </p>
      </div>
    </Disclosure>
  );
};

/** Where a sheet is chosen, dropped or pasted; a file that is none is refused before anything is sent. */
export const SheetSource = ({ text, isBusy, onSheet }: SheetSourceProps) => {
  const id = useId();
  const [fault, setFault] = useState('');
  const [isOver, setOver] = useState(false);
  const read = async (file: File | undefined): Promise<void> => {
    if (!file) return;
    const sheet = await readSheetFile(file);
    setFault(sheet.ok ? '' : sheet.error);
    if (sheet.ok) onSheet(sheet.value.text, sheet.value.remark);
  };
  const drag = (isNowOver: boolean) => (event: DragEvent) => {
    event.preventDefault();
    setOver(isNowOver);
  };
  return (
    <div className="grid gap-2">
      <div
        onDragOver={drag(true)}
        onDragLeave={drag(false)}
        onDrop={(event) => {
          drag(false)(event);
          void read(event.dataTransfer.files[0]);
        }}
        className={cx(
          'grid max-w-4xl justify-items-start gap-1.5 rounded-[18px] border-[2.5px] border-dashed px-5 py-4',
          isOver ? 'border-ink bg-panel' : 'border-soft',
        )}
      >
        <label htmlFor={id} className="font-extrabold">
          Choose a sheet, or drop it here
        </label>
        <p id={`${id}-hint`} className="text-[15px] text-soft">
          A CSV file: a line for each lot, a column for each element, decimal points or commas.
        </p>
        <input
          id={id}
          type="file"
          accept=".csv,.tsv,.txt,text/csv,text/tab-separated-values,text/plain"
          disabled={isBusy}
          aria-describedby={`${id}-hint ${id}-error`}
          onChange={({ currentTarget }) => {
            void read(currentTarget.files?.[0]);
            currentTarget.value = '';
          }}
          className="max-w-full file:mr-4 file:rounded-lg file:border-2 file:border-ink file:bg-panel file:px-3 file:py-1.5 file:font-extrabold file:text-ink"
        />
        <FieldError id={`${id}-error`} error={fault || undefined} />
      </div>
      <Paste text={text} isBusy={isBusy} onSheet={onSheet} />
    </div>
  );
};
