import { Notice } from '#src/ui/notice.tsx';

/** The sentence of a form that failed as a whole, above its button; nothing while there is none. */
export const FormProblem = ({ sentence }: { readonly sentence: string | undefined }) =>
  sentence ? <Notice kind="error" title={sentence} /> : null;
