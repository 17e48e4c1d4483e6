import { useId, type ReactNode } from 'react';

/** A part of the alloy's page under a heading of its own. */
export const Panel = ({ title, children }: { readonly title: string; readonly children: ReactNode }) => {
  const id = useId();
  return (
    <section aria-labelledby={id} className="grid grid-cols-1 content-start gap-3">
      <h2 id={id} className="text-[19px] font-black">
        {title}
      </h2>
      {children}
    </section>
  );
};

/** Words that open to show a table or a list. */
export const Disclosure = ({
  summary,
  children,
}: {
  readonly summary: string;
  readonly children: ReactNode;
}) => (
  <details className="group">
    <summary className="inline-flex min-h-11 items-center rounded-lg font-extrabold underline decoration-2 underline-offset-4">
      {summary}
    </summary>
    <div className="pt-2 pb-3">{children}</div>
  </details>
);
