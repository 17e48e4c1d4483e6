import { useNavigate } from 'react-router-dom';
import { useCreatePerson } from '#src/api/people.ts';
import { PageTitle } from '#src/ui/page-title.tsx';
import { PersonForm } from './person-form.tsx';
import { emptyPerson, newPersonForm } from './person-values.ts';

/** Adds someone to the studio. */
export const NewPersonPage = () => {
  const create = useCreatePerson();
  const navigate = useNavigate();
  return (
    <>
      <PageTitle title="Add a person" summary="They can sign in as soon as they are added." />
      <PersonForm
        values={emptyPerson}
        schema={newPersonForm}
        submitName="Add the person"
        isChange={false}
        hasPin={false}
        onSubmit={async (request) => {
          await create.mutateAsync(request);
          await navigate('/people');
        }}
      />
    </>
  );
};
