import { Outlet } from 'react-router-dom';
import { useSession } from '#src/api/session.ts';
import { sentenceOf } from '#src/lib/http.ts';
import { Button } from '#src/ui/button.tsx';
import { Notice } from '#src/ui/notice.tsx';
import { Spinner } from '#src/ui/spinner.tsx';
import { SignInPage } from '../features/sign-in/sign-in-page.tsx';
import { DeskSessionContext } from '../parts/desk-session.ts';
import { NoDeskPage } from './no-desk-page.tsx';

/** Shows the desk to those who may see it; others sign in, or read why not. The address is kept for afterwards. */
export const SessionGate = () => {
  const { data: session, error, refetch, isFetching } = useSession();
  if (!session) {
    return (
      <main className="mx-auto max-w-xl p-6 pt-24">
        <title>Ladlemark</title>
        {error ? (
          <Notice
            kind="error"
            title={sentenceOf(error)}
            action={
              <Button busy={isFetching} onClick={() => void refetch()}>
                Try again
              </Button>
            }
          />
        ) : (
          <Spinner label="Opening the desk" />
        )}
      </main>
    );
  }
  const { person } = session;
  if (!person) return <SignInPage studioName={session.studio.name} />;
  if (!session.abilities.seeDesk) return <NoDeskPage name={person.name} />;
  return (
    <DeskSessionContext value={{ ...session, person }}>
      <Outlet />
    </DeskSessionContext>
  );
};
