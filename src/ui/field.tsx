import { useId, type ReactNode } from 'react';

/** What every field at the desk has around it. */
export interface FieldFrame {
  readonly label: string;
  /** A sentence on what belongs in the field. */
  readonly hint?: string;
  /** The sentence that says what is wrong and what to do; the field keeps what was typed. */
  readonly error?: string;
}

/** Attributes that tie a control to its label, hint and error. */
export interface FieldWiring {
  readonly id: string;
  readonly 'aria-describedby': string | undefined;
  readonly 'aria-invalid': true | undefined;
}

/** Props of {@link Field}. */
export interface FieldProps extends FieldFrame {
  readonly children: (wiring: FieldWiring) => ReactNode;
}

/** A label, hint and error sentence around any control; the control takes the wiring it is given. */
export const Field = ({ label, hint, error, children }: FieldProps) => {
  const id = useId();
  const described = [hint && `${id}-hint`, error && `${id}-error`].filter(Boolean).join(' ');
  return (
    <div className="grid gap-1.5">
      <label htmlFor={id} className="font-extrabold">
        {label}
      </label>
      {hint ? (
        <p id={`${id}-hint`} className="text-[15px] text-soft">
          {hint}
        </p>
      ) : null}
      {children({ id, 'aria-describedby': described || undefined, 'aria-invalid': error ? true : undefined })}
      <FieldError id={`${id}-error`} error={error} />
    </div>
  );
};

/** The error sentence of a field, announced when it appears. */
export const FieldError = ({ id, error }: { readonly id: string; readonly error: string | undefined }) => (
  <p id={id} role="alert" className={error ? 'flex gap-2 font-extrabold text-ember' : 'hidden'}>
    {error ? (
      <>
        <svg viewBox="-12 -12 24 24" className="mt-0.5 size-5 shrink-0" fill="none" aria-hidden="true">
          <path d="M0 -8 9.5 8.5H-9.5Z" stroke="currentColor" strokeWidth="3" strokeLinejoin="round" />
          <path d="M0 -2.5V2M0 5.2v.01" stroke="currentColor" strokeWidth="3" strokeLinecap="round" />
        </svg>
        {error}
      </>
    ) : null}
  </p>
);
