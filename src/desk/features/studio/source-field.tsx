import { TextAreaField } from '#src/ui/text-area-field.tsx';
import { faultAt, type FormPart } from './form-parts.ts';
import type { StudioValues } from './studio-values.ts';

/** Props of {@link SourceField}. */
export interface SourceFieldProps extends FormPart {
  readonly of: keyof StudioValues['processTables']['sources'];
  readonly label: string;
}

/** Where figures come from; shown beside them whenever a figure is pressed. */
export const SourceField = ({ of, label, register, errors }: SourceFieldProps) => {
  const path = `processTables.sources.${of}` as const;
  return <TextAreaField label={label} rows={2} error={faultAt(errors, path)} {...register(path)} />;
};
