/** Props of {@link Wordmark}. */
export interface WordmarkProps {
  readonly size?: 'desk' | 'terminal';
}

/** The product's name beside its sign: a beam at rest on a fulcrum, the heavier weight on the shorter arm. */
export const Wordmark = ({ size = 'desk' }: WordmarkProps) => (
  <span
    className={`inline-flex items-center gap-[0.4em] font-black tracking-tight ${size === 'desk' ? 'text-2xl' : 'text-[32px]'}`}
  >
    <svg viewBox="0 0 48 48" className="size-[1.45em]" fill="none" aria-hidden="true">
      <path d="M4 31h40" className="stroke-ink" strokeWidth="5" strokeLinecap="round" />
      <path d="m18 36-8 9h16z" className="fill-ink stroke-ink" strokeWidth="2" strokeLinejoin="round" />
      <circle cx="11" cy="19" r="9.5" className="fill-ember-fill" />
      <circle cx="38" cy="23" r="4" className="stroke-iron" strokeWidth="3" />
    </svg>
    Ladlemark
  </span>
);
