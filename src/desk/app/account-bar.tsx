import { useSignOut } from '#src/api/session.ts';
import { useTheme } from '#src/lib/theme.ts';
import { Button } from '#src/ui/button.tsx';
import { Icon } from '#src/ui/icon.tsx';
import { useDeskSession } from '../parts/desk-session.ts';

const quiet =
  'inline-flex min-h-11 items-center gap-2 rounded-lg px-2 font-extrabold text-soft hover:text-ink';

/** Who is signed in, the way to the terminal, the theme, and the way out. */
export const AccountBar = () => {
  const { person } = useDeskSession();
  const [theme, toggleTheme] = useTheme();
  const signOut = useSignOut();
  return (
    <div className="flex flex-wrap items-center gap-x-2">
      <a href="/kiosk" className={quiet}>
        Open the terminal
      </a>
      <button
        type="button"
        onClick={toggleTheme}
        className={quiet}
        aria-label={theme === 'day' ? 'Lights down: melt room theme' : 'Lights up: day theme'}
      >
        <Icon name={theme === 'day' ? 'melt-room' : 'day'} className="size-5" />
      </button>
      <span className="inline-flex items-center gap-2 px-2 font-extrabold">
        <Icon name="person" className="size-5" />
        <span className="sr-only">Signed in as </span>
        {person.name}
      </span>
      <Button
        kind="quiet"
        className="!min-h-11 !px-2"
        busy={signOut.isPending}
        onClick={() => signOut.mutate()}
      >
        Sign out
      </Button>
    </div>
  );
};
