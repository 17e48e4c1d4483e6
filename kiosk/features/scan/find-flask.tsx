import { useQuery, useQueryClient } from '@tanstack/react-query';
import { useEffect } from 'react';
import { Navigate, useNavigate, useSearchParams } from 'react-router-dom';
import { cardQuery, findCard } from '#src/api/cards.ts';
import { sentenceOf, UnreachableError } from '#src/lib/http.ts';
import { Button } from '#src/ui/button.tsx';
import { Spinner } from '#src/ui/spinner.tsx';
import { useScanner } from '#kiosk/lib/use-scanner.ts';
import { RefusedCode } from './refused-code.tsx';
import { addressOfCode, refusalOfCode } from '#kiosk/lib/scan-target.ts';

/** Looks a scanned or typed code up and goes to its card, or says why not. */
export const FindFlask = () => {
  const code = useSearchParams()[0].get('code') ?? '';
  const navigate = useNavigate();
  const refusal = refusalOfCode(code);
  useScanner((next) => {
    void navigate(addressOfCode(next), { replace: true });
    return true;
  });
  return refusal === null ? (
    <Lookup key={code} code={code} />
  ) : (
    <RefusedCode code={code} sentence={refusal} />
  );
};

const Lookup = ({ code }: { readonly code: string }) => {
  const client = useQueryClient();
  const { data, error, refetch, isFetching } = useQuery({
    queryKey: ['cards', 'found', code],
    queryFn: () => findCard(code),
    staleTime: 0,
    gcTime: 0,
    retry: false,
  });
  useEffect(() => {
    if (data) client.setQueryData(cardQuery(data.casting.id).queryKey, data);
  }, [client, data]);
  if (data) return <Navigate to={`/cards/${data.casting.id}`} replace />;
  if (error) {
    return (
      <RefusedCode
        code={code}
        sentence={sentenceOf(error)}
        retry={
          error instanceof UnreachableError ? (
            <Button size="terminal" busy={isFetching} onClick={() => void refetch()}>
              Ask again
            </Button>
          ) : undefined
        }
      />
    );
  }
  return (
    <main className="grid h-dvh place-items-center bg-ground text-4xl font-black text-ink">
      <h1 className="sr-only">Looking the flask up</h1>
      <Spinner label={`Looking ${code} up`} />
    </main>
  );
};
