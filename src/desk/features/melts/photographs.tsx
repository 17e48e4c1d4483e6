import { useQuery } from '@tanstack/react-query';
import { useEffect, useRef } from 'react';
import type { Photograph } from '#shared/contracts/card.ts';
import type { Melt } from '#shared/contracts/melt.ts';
import { photographPath, photographQuery } from '#src/api/melts.ts';
import { sentenceOf } from '#src/lib/http.ts';
import { Spinner } from '#src/ui/spinner.tsx';
import { useStudio } from '#src/desk/parts/use-studio.ts';
import { sentenceOfStep } from './step-records.ts';

const subjects = { tree: 'The tree', defect: 'A defect', other: 'The work' } as const;

/** What a photograph shows, by the entry of the book that names it. */
const subjectOf = (melt: Melt, id: string): string => {
  for (const { event } of melt.events) {
    if (event.type === 'photographed' && event.photographId === id) return subjects[event.of];
    const answer = event.type === 'step-done' && event.answer.kind === 'photograph' ? event.answer : null;
    if (event.type === 'step-done' && answer?.photographId === id) return sentenceOfStep(melt)(event.key);
  }
  return 'Not named by any entry yet';
};

/** A picture from its bytes: it is never loaded as a page, and its address is ours and ends with it. */
const Picture = ({ blob, alt }: { readonly blob: Blob; readonly alt: string }) => {
  const image = useRef<HTMLImageElement>(null);
  useEffect(() => {
    const url = URL.createObjectURL(blob);
    if (image.current) image.current.src = url;
    return () => URL.revokeObjectURL(url);
  }, [blob]);
  return <img ref={image} alt={alt} className="size-full object-cover" />;
};

const Thumbnail = ({ melt, photograph }: { readonly melt: Melt; readonly photograph: Photograph }) => {
  const { clock } = useStudio();
  const { id, person, at } = photograph;
  const picture = useQuery(photographQuery(melt.id, id));
  const subject = subjectOf(melt, id);
  return (
    <li className="grid content-start gap-1">
      <a
        href={photographPath(melt.id, id)}
        download={`${melt.code}-${id.slice(0, 8)}`}
        className="block aspect-[4/3] overflow-hidden rounded-xl border-2 border-line bg-panel"
      >
        {picture.data ? (
          <Picture blob={picture.data} alt={`${subject}, photographed by ${person}; store it`} />
        ) : picture.error ? (
          <span className="block p-3 font-extrabold text-ember">{sentenceOf(picture.error)}</span>
        ) : (
          <Spinner label="Reading the picture" />
        )}
      </a>
      <p className="font-extrabold">{subject}</p>
      <p className="text-[15px] text-soft">
        {person}, {clock.exactTime(at)}
      </p>
    </li>
  );
};

/** The photographs of a melt, small; pressing one stores it. */
export const Photographs = ({ melt }: { readonly melt: Melt }) =>
  melt.photographs.length === 0 ? (
    <p className="text-soft">None was taken.</p>
  ) : (
    <ul className="grid grid-cols-[repeat(auto-fill,minmax(150px,1fr))] gap-4">
      {melt.photographs.map((photograph) => (
        <Thumbnail key={photograph.id} melt={melt} photograph={photograph} />
      ))}
    </ul>
  );
