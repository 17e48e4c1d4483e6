import { useNavigate } from 'react-router-dom';
import { useDraftInstruction } from '#src/api/instructions.ts';
import { sentenceOf } from '#src/lib/http.ts';
import { Button } from '#src/ui/button.tsx';

/** Drafts a new revision that begins as this one stands, and opens it. */
export const DraftButton = ({ from, children }: { readonly from: string; readonly children: string }) => {
  const draft = useDraftInstruction();
  const navigate = useNavigate();
  const press = async (): Promise<void> => {
    const { id } = await draft.mutateAsync({ from });
    await navigate(`/instructions/${id}`);
  };
  return (
    <span className="inline-grid gap-1">
      <Button icon="plus" busy={draft.isPending} onClick={() => void press().catch(() => undefined)}>
        {children}
      </Button>
      {draft.error ? (
        <span role="alert" className="font-extrabold text-ember">
          {sentenceOf(draft.error)}
        </span>
      ) : null}
    </span>
  );
};
