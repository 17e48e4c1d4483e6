import { useEffect } from 'react';
import { Outlet } from 'react-router-dom';
import type { Session } from '#shared/contracts/session.ts';
import { useSession, useSignOut } from '#src/api/session.ts';
import { sentenceOf } from '#src/lib/http.ts';
import { useTheme } from '#src/lib/theme.ts';
import { Button } from '#src/ui/button.tsx';
import { Spinner } from '#src/ui/spinner.tsx';
import { EnrolScreen } from '#kiosk/features/enrol/enrol-screen.tsx';
import { SignInScreen } from '#kiosk/features/sign-in/sign-in-screen.tsx';
import { MessageScreen } from '#kiosk/lib/message-screen.tsx';
import { PresenceContext } from '#kiosk/lib/presence.ts';
import { useOutbox } from '#kiosk/outbox/outbox-context.ts';
import { usePhotographBox, useUndelivered } from '#kiosk/outbox/photograph-context.ts';
import { usePaintedComfort } from '#kiosk/lib/comfort.ts';
import { Alarms } from './alarms.tsx';
import { useIdleLock } from './use-idle-lock.ts';

interface SignedInProps {
  readonly session: Session;
  readonly person: NonNullable<Session['person']>;
  readonly terminal: NonNullable<Session['terminal']>;
}

const SignedIn = ({ session: { studio }, person, terminal }: SignedInProps) => {
  const { mutate, isPending } = useSignOut();
  const hasWaiting = useUndelivered() > 0;
  const signOut = (): void => {
    if (!hasWaiting && !isPending) mutate();
  };
  useIdleLock(studio.idleLockS, signOut);
  return (
    <PresenceContext value={{ person, terminal, studio, signOut }}>
      <Outlet />
    </PresenceContext>
  );
};

const Gate = ({ session }: { readonly session: Session }) => {
  const { person, terminal } = session;
  if (!terminal) return <EnrolScreen studioName={session.studio.name} />;
  if (!person) return <SignInScreen terminal={terminal} />;
  return <SignedIn session={session} person={person} terminal={terminal} />;
};

/** Decides what this device may show: enrolment, sign-in, or the work of the person signed in. */
export const Shell = () => {
  useTheme();
  usePaintedComfort();
  const { data: session, error, refetch, isFetching } = useSession();
  const outbox = useOutbox();
  const photographs = usePhotographBox();
  const personId = session?.person?.id ?? null;
  useEffect(() => {
    outbox.setPerson(personId);
    photographs.setPerson(personId);
  }, [outbox, photographs, personId]);
  if (session) {
    return (
      <>
        <Gate session={session} />
        <Alarms />
      </>
    );
  }
  if (!error) {
    return (
      <main className="grid h-dvh place-items-center bg-ground text-3xl font-black text-ink">
        <h1 className="sr-only">Ladlemark terminal</h1>
        <Spinner label="Asking the server who is here" />
      </main>
    );
  }
  return (
    <MessageScreen
      state="stop"
      mark="No answer"
      sentence={sentenceOf(error)}
      actions={
        <Button kind="main" size="terminal" busy={isFetching} onClick={() => void refetch()}>
          Try again
        </Button>
      }
    />
  );
};
