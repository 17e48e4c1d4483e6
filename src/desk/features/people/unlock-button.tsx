import type { Person } from '#shared/contracts/person.ts';
import { useUnlockPerson } from '#src/api/people.ts';
import { sentenceOf } from '#src/lib/http.ts';
import { Button } from '#src/ui/button.tsx';

/** Opens a person's sign-in at the terminals again after too many wrong PINs. */
export const UnlockButton = ({ person }: { readonly person: Person }) => {
  const unlock = useUnlockPerson();
  return (
    <span className="relative z-10 inline-grid gap-1">
      <Button icon="lock" busy={unlock.isPending} onClick={() => unlock.mutate(person.id)}>
        Unlock the PIN<span className="sr-only"> of {person.name}</span>
      </Button>
      {unlock.error ? (
        <span role="alert" className="font-extrabold text-ember">
          {sentenceOf(unlock.error)}
        </span>
      ) : null}
    </span>
  );
};
