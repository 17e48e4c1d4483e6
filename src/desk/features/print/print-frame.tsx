import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { Button } from '#src/ui/button.tsx';
import { buttonClass } from '#src/ui/button-class.ts';

/** Props of {@link PrintFrame}. */
export interface PrintFrameProps {
  readonly title: string;
  /** What to know before printing, in a sentence. */
  readonly advice: string;
  readonly backTo: string;
  readonly backName: string;
  readonly children: ReactNode;
}

/** What is to be printed, with its own words above it that stay on the screen. */
export const PrintFrame = ({ title, advice, backTo, backName, children }: PrintFrameProps) => (
  <main className="overflow-x-auto px-4 pb-16 sm:px-10 print:overflow-visible print:p-0">
    <title>{`${title} · Ladlemark`}</title>
    <header className="screen-only flex flex-wrap items-start justify-between gap-6 py-8">
      <div>
        <h1 className="text-[28px] font-black tracking-tight">{title}</h1>
        <p className="max-w-[70ch] text-soft">{advice}</p>
      </div>
      <p className="flex flex-wrap gap-3">
        <Link to={backTo} className={buttonClass()}>
          {backName}
        </Link>
        <Button kind="main" icon="print" onClick={() => window.print()}>
          Print
        </Button>
      </p>
    </header>
    {children}
  </main>
);
