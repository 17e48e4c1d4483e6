import { get, type FieldError, type FieldErrors, type Path, type UseFormRegister } from 'react-hook-form';
import type { StudioValues } from './studio-values.ts';

/** What a part of the settings' form needs of the whole. */
export interface FormPart {
  readonly register: UseFormRegister<StudioValues>;
  readonly errors: FieldErrors<StudioValues>;
}

/** The sentence at a field, if there is one. */
export const faultAt = (errors: FieldErrors<StudioValues>, path: Path<StudioValues>): string | undefined => {
  const fault: unknown = get(errors, path);
  return (fault as Partial<FieldError> | undefined)?.message;
};
