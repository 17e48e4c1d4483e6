import { useQuery } from '@tanstack/react-query';
import { Link, useNavigate, useParams } from 'react-router-dom';
import type { Person } from '#shared/contracts/person.ts';
import { peopleQuery, useUpdatePerson } from '#src/api/people.ts';
import { buttonClass } from '#src/ui/button-class.ts';
import { Notice } from '#src/ui/notice.tsx';
import { PageTitle } from '#src/ui/page-title.tsx';
import { Loaded } from '#src/desk/parts/loaded.tsx';
import { PersonForm } from './person-form.tsx';
import { SupervisedPanel } from './supervised-panel.tsx';
import { changedPersonForm, valuesOf } from './person-values.ts';
import { UnlockButton } from './unlock-button.tsx';

const ChangePerson = ({ person }: { readonly person: Person }) => {
  const update = useUpdatePerson(person.id);
  const navigate = useNavigate();
  return (
    <>
      <PageTitle
        title={person.name}
        summary={person.active ? person.roles.join(', ') : 'No longer works here.'}
        actions={person.pinLocked ? <UnlockButton person={person} /> : null}
      />
      <PersonForm
        key={person.id}
        values={valuesOf(person)}
        schema={changedPersonForm}
        submitName="Store the changes"
        isChange
        hasPin={person.hasPin}
        onSubmit={async (request) => {
          await update.mutateAsync(request);
          await navigate('/people');
        }}
      />
      <SupervisedPanel person={person} />
    </>
  );
};

/** One person: what they are called, may do and sign in with. */
export const PersonPage = () => {
  const { personId } = useParams();
  const people = useQuery(peopleQuery);
  return (
    <Loaded query={people} what="the people">
      {(list) => {
        const person = list.find(({ id }) => id === personId);
        return person ? (
          <ChangePerson person={person} />
        ) : (
          <>
            <PageTitle title="Nobody here" />
            <Notice
              kind="empty"
              title="There is no person at this address."
              action={
                <Link to="/people" className={buttonClass()}>
                  See everyone
                </Link>
              }
            />
          </>
        );
      }}
    </Loaded>
  );
};
