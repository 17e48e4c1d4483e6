import type { ReactNode } from 'react';

/** Props of {@link SettingsSection}. */
export interface SettingsSectionProps {
  readonly id: string;
  readonly title: string;
  /** What these settings do, in a sentence. */
  readonly about: string;
  readonly children: ReactNode;
}

/** A part of the settings: its title and meaning at the left, its fields at the right, a line above. */
export const SettingsSection = ({ id, title, about, children }: SettingsSectionProps) => (
  <section
    aria-labelledby={id}
    className="grid gap-x-14 gap-y-5 border-t-2 border-line py-8 lg:grid-cols-[260px_minmax(0,1fr)]"
  >
    <div>
      <h2 id={id} className="text-[21px] font-black">
        {title}
      </h2>
      <p className="mt-1 text-soft">{about}</p>
    </div>
    <div className="grid min-w-0 content-start gap-5">{children}</div>
  </section>
);
