import { useEffect, useId, useRef, type ReactNode } from 'react';
import { Icon } from './icon.tsx';

/** Props of {@link Dialog}. */
export interface DialogProps {
  readonly open: boolean;
  /** Runs when the dialog is closed by Escape, by its cross or by a press outside. */
  readonly onClose: () => void;
  readonly title: string;
  readonly children: ReactNode;
  /** Buttons at the foot. */
  readonly actions?: ReactNode;
  readonly size?: 'desk' | 'terminal';
  /** False for a question that must be answered: no cross, and a press outside does nothing. Escape still closes. */
  readonly dismissible?: boolean;
}

const sizes = {
  desk: { box: 'w-[min(560px,92vw)] p-6 gap-4', title: 'text-[22px]', cross: 'size-11' },
  terminal: { box: 'w-[min(920px,94vw)] p-10 gap-7 text-2xl', title: 'text-4xl', cross: 'size-18' },
} as const;

const stops = [
  '[data-part="content"] :is(input, select, textarea):enabled',
  '[data-part="actions"] button[data-kind="main"]',
  '[data-part="actions"] button',
];

/** Where the focus begins: the first field, or else the main action; left to the browser, it would be the cross. */
const firstStop = (dialog: HTMLDialogElement): HTMLElement | undefined =>
  stops.flatMap((stop) => dialog.querySelector<HTMLElement>(stop) ?? []).at(0);

/** A modal question or explanation, on the browser's own dialog element, which keeps the focus inside. */
export const Dialog = ({
  open,
  onClose,
  title,
  children,
  actions,
  size = 'desk',
  dismissible = true,
}: DialogProps) => {
  const dialog = useRef<HTMLDialogElement>(null);
  const heading = useId();
  const look = sizes[size];
  useEffect(() => {
    const element = dialog.current;
    if (open && element && !element.open) {
      element.showModal();
      firstStop(element)?.focus();
    }
    return () => element?.close();
  }, [open]);
  if (!open) return null;
  return (
    <dialog
      ref={dialog}
      aria-labelledby={heading}
      onCancel={(event) => {
        event.preventDefault();
        onClose();
      }}
      onClick={(event) => {
        if (dismissible && event.target === event.currentTarget) onClose();
      }}
      className="m-auto max-h-[calc(94dvh/var(--zoom,1))] overflow-auto rounded-[26px] border-[3px] border-ink bg-panel p-0 text-ink"
    >
      <div className={`grid ${look.box}`}>
        <div className="flex items-start justify-between gap-6">
          <h2 id={heading} className={`font-black ${look.title}`}>
            {title}
          </h2>
          {dismissible ? (
            <button
              type="button"
              aria-label="Close"
              onClick={onClose}
              className={`-mt-2 -mr-3 grid shrink-0 place-items-center rounded-2xl ${look.cross}`}
            >
              <Icon name="cross" className={size === 'terminal' ? 'size-9' : 'size-5'} />
            </button>
          ) : null}
        </div>
        <div data-part="content">{children}</div>
        {actions ? (
          <div data-part="actions" className="flex flex-wrap gap-4">
            {actions}
          </div>
        ) : null}
      </div>
    </dialog>
  );
};
