import type { ReactNode } from 'react';

/** One row of a {@link DefinitionList}. */
export interface Definition {
  readonly term: string;
  readonly value: ReactNode;
  /** A few quiet words after the value, such as its range. */
  readonly note?: ReactNode;
}

/** Props of {@link DefinitionList}. */
export interface DefinitionListProps {
  readonly items: readonly Definition[];
  readonly size?: 'desk' | 'terminal';
}

/** Terms and their values, a ruled line each; terms must differ within one list. */
export const DefinitionList = ({ items, size = 'desk' }: DefinitionListProps) => {
  // At the desk values stand under one another, whether a note follows or not.
  const isNoted = size === 'desk' && items.some(({ note }) => Boolean(note));
  return (
    <dl className={size === 'terminal' ? 'text-2xl' : 'text-base'}>
      {items.map(({ term, value, note }) => (
        <div key={term} className="flex items-baseline gap-4 border-t-2 border-line py-[0.55em]">
          <dt className="text-soft">{term}</dt>
          <dd className="ml-auto text-right font-extrabold">{value}</dd>
          {note || isNoted ? <dd className="min-w-32 text-right text-[0.9em] text-soft">{note}</dd> : null}
        </div>
      ))}
    </dl>
  );
};
