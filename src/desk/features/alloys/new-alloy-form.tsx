import { useFormContext } from 'react-hook-form';
import { Link, useNavigate } from 'react-router-dom';
import { createAlloyRequest } from '#shared/contracts/alloy.ts';
import { alloyFamilies, alloyFamilyNames } from '#shared/domain/alloy/alloy-family.ts';
import { useCreateAlloy } from '#src/api/alloys.ts';
import { buttonClass } from '#src/ui/button-class.ts';
import { PageTitle } from '#src/ui/page-title.tsx';
import { SelectField } from '#src/ui/select-field.tsx';
import { TextField } from '#src/ui/text-field.tsx';
import { AlloyForm } from './alloy-form.tsx';
import { emptyAlloyForm, type AlloyFormValues } from './alloy-form-values.ts';
import { capitalised } from './element-names.ts';

const families = alloyFamilies.map((family) => ({
  value: family,
  label: capitalised(alloyFamilyNames[family]),
}));

const IdentityFields = () => {
  const { register, formState } = useFormContext<AlloyFormValues>();
  return (
    <div className="grid items-start gap-4 sm:grid-cols-2">
      <TextField
        label="Name"
        hint="As the studio calls it."
        autoComplete="off"
        error={formState.errors.name?.message}
        {...register('name')}
      />
      <SelectField
        label="Family"
        hint="For flasks, crucibles and cautions."
        placeholder="Choose a family"
        options={families}
        error={formState.errors.family?.message}
        {...register('family')}
      />
    </div>
  );
};

/** Adds an alloy with its first draft. */
export const NewAlloyForm = () => {
  const create = useCreateAlloy();
  const navigate = useNavigate();
  return (
    <>
      <PageTitle title="Add an alloy" summary="It starts as a draft: checked and approved, it may be cast." />
      <AlloyForm
        contract={createAlloyRequest}
        defaults={emptyAlloyForm}
        submitWords="Add the alloy"
        send={async (request) => {
          const alloy = await create.mutateAsync(request);
          await navigate(`/alloys/${alloy.id}`);
        }}
        cancel={
          <Link to="/alloys" className={buttonClass({ kind: 'quiet' })}>
            Leave without adding
          </Link>
        }
      >
        <IdentityFields />
      </AlloyForm>
    </>
  );
};
