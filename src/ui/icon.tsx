import { iconPaths, type IconName } from './icon-paths.tsx';

export type { IconName };

/** Props of {@link Icon}. */
export interface IconProps {
  readonly name: IconName;
  /** Utility classes for size; without them the icon is as tall as the text beside it. */
  readonly className?: string;
}

/** A small picture of our own, drawn in the colour of the text beside it; it never carries meaning alone. */
export const Icon = ({ name, className = 'size-[1.25em]' }: IconProps) => (
  <svg
    viewBox="0 0 40 40"
    className={`shrink-0 ${className}`}
    fill="none"
    stroke="currentColor"
    strokeWidth="4"
    strokeLinecap="round"
    strokeLinejoin="round"
    aria-hidden="true"
  >
    {iconPaths[name]}
  </svg>
);
