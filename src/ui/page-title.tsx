import type { ReactNode } from 'react';

/** Props of {@link PageTitle}. */
export interface PageTitleProps {
  readonly title: string;
  /** A chip or state mark beside the title. */
  readonly mark?: ReactNode;
  /** One sentence on what the page holds. */
  readonly summary?: ReactNode;
  /** Buttons at the right. */
  readonly actions?: ReactNode;
}

/** The head of a desk page; it also names the browser's tab. */
export const PageTitle = ({ title, mark, summary, actions }: PageTitleProps) => (
  <header className="flex flex-wrap items-start justify-between gap-x-8 gap-y-4 pb-6">
    <title>{`${title} \u00b7 Ladlemark`}</title>
    <div>
      <div className="flex flex-wrap items-center gap-4">
        <h1 className="text-[34px] leading-tight font-black tracking-tight">{title}</h1>
        {mark}
      </div>
      {summary ? <p className="mt-1 text-[17px] text-soft">{summary}</p> : null}
    </div>
    {actions ? <div className="screen-only flex flex-wrap gap-3">{actions}</div> : null}
  </header>
);
