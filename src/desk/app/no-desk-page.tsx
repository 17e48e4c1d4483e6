import { useSignOut } from '#src/api/session.ts';
import { Button } from '#src/ui/button.tsx';
import { buttonClass } from '#src/ui/button-class.ts';
import { Wordmark } from '#src/ui/wordmark.tsx';

/** What someone sees whose roles do not reach the desk: why, and where their work is. */
export const NoDeskPage = ({ name }: { readonly name: string }) => {
  const signOut = useSignOut();
  return (
    <main className="mx-auto grid max-w-2xl gap-6 p-6 pt-[12vh]">
      <title>Not at the desk · Ladlemark</title>
      <Wordmark />
      <h1 className="text-[34px] leading-tight font-black tracking-tight">Your work is at the terminal</h1>
      <p className="text-[19px] text-soft">
        {name}, the desk is for owners, casters and jewellers. Scan a flask at the terminal beside the
        furnace; the studio’s owner can give you another role.
      </p>
      <p className="flex flex-wrap gap-3">
        <a href="/kiosk" className={buttonClass({ kind: 'main' })}>
          Open the terminal
        </a>
        <Button busy={signOut.isPending} onClick={() => signOut.mutate()}>
          Sign out
        </Button>
      </p>
    </main>
  );
};
