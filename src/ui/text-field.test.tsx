import { render, screen, waitFor } from '@testing-library/react';
import { userEvent } from '@testing-library/user-event';
import { useForm } from 'react-hook-form';
import { describe, expect, it } from 'vitest';
import { CheckField } from './check-field.tsx';
import { SelectField } from './select-field.tsx';
import { TextField } from './text-field.tsx';

const MassForm = () => {
  const { register, handleSubmit, formState } = useForm<{ mass: string }>();
  return (
    <form onSubmit={(event) => void handleSubmit(() => undefined)(event)}>
      <TextField
        label="Mass"
        hint="In grams"
        error={formState.errors.mass?.message}
        {...register('mass', { pattern: { value: /^\d+$/, message: 'A mass is a number of grams.' } })}
      />
      <button>Save</button>
    </form>
  );
};

describe('TextField', () => {
  it('ties its label and hint to the input', () => {
    render(<TextField label="Mass" hint="In grams" />);
    expect(screen.getByLabelText('Mass')).toHaveAccessibleDescription('In grams');
    expect(screen.getByLabelText('Mass')).toBeValid();
  });

  it('in a form says what is wrong at the field, keeps what was typed and takes the focus', async () => {
    render(<MassForm />);
    const input = screen.getByLabelText('Mass');
    await userEvent.type(input, 'abc');
    await userEvent.click(screen.getByRole('button', { name: 'Save' }));
    await waitFor(() => expect(screen.getByRole('alert')).toHaveTextContent('A mass is a number of grams.'));
    expect(input).toBeInvalid();
    expect(input).toHaveAccessibleDescription('In grams A mass is a number of grams.');
    expect(input).toHaveValue('abc');
    expect(input).toHaveFocus();
  });
});

describe('SelectField', () => {
  it('offers its options after the empty choice', () => {
    render(<SelectField label="Alloy" placeholder="Choose" options={[{ value: 'ag', label: 'Sterling' }]} />);
    expect(screen.getAllByRole('option').map((option) => option.textContent)).toEqual(['Choose', 'Sterling']);
  });
});

describe('CheckField', () => {
  it('is ticked by a press on its words', async () => {
    render(<CheckField label="Charge is dry" hint="Preheated too" size="terminal" />);
    await userEvent.click(screen.getByText('Charge is dry'));
    expect(screen.getByRole('checkbox')).toBeChecked();
  });
});
