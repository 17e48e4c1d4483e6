import { useId } from 'react';
import type { LotDetail } from '#shared/contracts/lot.ts';
import { documentTypes } from '#shared/domain/metal/document-type.ts';
import { lotDocumentPath, useAddLotDocument } from '#src/api/lots.ts';
import { ProblemError, sentenceOf } from '#src/lib/http.ts';
import { FieldError } from '#src/ui/field.tsx';
import { Spinner } from '#src/ui/spinner.tsx';
import { useStudio } from '#src/desk/parts/use-studio.ts';

/** The size of a file in words. */
export const sizeWords = (bytes: number): string =>
  bytes < 1_000_000 ? `${Math.max(1, Math.round(bytes / 1000))} kB` : `${(bytes / 1_000_000).toFixed(1)} MB`;

const faultOf = (error: Error | null): string | undefined => {
  if (!error) return undefined;
  const field = error instanceof ProblemError ? error.problem.fields?.[0]?.message : undefined;
  return field ?? sentenceOf(error);
};

const Upload = ({ lotId }: { readonly lotId: string }) => {
  const id = useId();
  const add = useAddLotDocument(lotId);
  return (
    <div className="screen-only grid gap-1.5">
      <label htmlFor={id} className="font-extrabold">
        Add a document
      </label>
      <p id={`${id}-hint`} className="text-[15px] text-soft">
        A certificate or a photograph: PDF, JPEG, PNG or WebP, at most 10 MB. It is kept for good.
      </p>
      <input
        id={id}
        type="file"
        accept={documentTypes.join(',')}
        disabled={add.isPending}
        aria-describedby={`${id}-hint ${id}-error`}
        onChange={({ currentTarget }) => {
          const [file] = currentTarget.files ?? [];
          if (file) add.mutate(file);
          currentTarget.value = '';
        }}
        className="max-w-full rounded-xl border-2 border-soft bg-panel p-2 file:mr-4 file:rounded-lg file:border-2 file:border-ink file:bg-ground file:px-3 file:py-1.5 file:font-extrabold"
      />
      {add.isPending ? <Spinner label="Sending the document" /> : null}
      <FieldError id={`${id}-error`} error={faultOf(add.error)} />
    </div>
  );
};

/** The papers of a lot, and where one is added. */
export const LotDocuments = ({ lot }: { readonly lot: LotDetail }) => {
  const { clock } = useStudio();
  return (
    <div className="grid gap-5">
      {lot.documents.length === 0 ? <p className="text-soft">No document is kept with this lot.</p> : null}
      <ul className="grid">
        {lot.documents.map(({ id, name, bytes, person, at }) => (
          <li key={id} className="grid gap-0.5 border-t-2 border-line py-2">
            <a
              href={lotDocumentPath(lot.id, id)}
              target="_blank"
              rel="noreferrer"
              className="font-extrabold break-words underline decoration-2 underline-offset-4"
            >
              {name}
            </a>
            <span className="text-[15px] text-soft">
              {sizeWords(bytes)}, {person}, {clock.dayAndTime(at)}
            </span>
          </li>
        ))}
      </ul>
      {lot.abilities.amend ? <Upload lotId={lot.id} /> : null}
    </div>
  );
};
