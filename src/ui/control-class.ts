/** The classes of a control one types or chooses in; a wrong one is told by a thicker border besides its sentence. */
export const controlClass =
  'min-h-[46px] w-full rounded-xl border-2 border-soft bg-panel px-3.5 py-2 text-ink placeholder:text-soft aria-invalid:border-[3px] aria-invalid:border-ember disabled:border-line disabled:text-soft';
