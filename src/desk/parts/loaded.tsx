import type { ReactNode } from 'react';
import { sentenceOf } from '#src/lib/http.ts';
import { Button } from '#src/ui/button.tsx';
import { Notice } from '#src/ui/notice.tsx';
import { Spinner } from '#src/ui/spinner.tsx';

/** Props of {@link Loaded}. */
export interface LoadedProps<Data> {
  readonly query: {
    readonly data: Data | undefined;
    readonly error: Error | null;
    readonly refetch: () => unknown;
    readonly isFetching: boolean;
  };
  /** What is being read, to stand after "Reading": "the melt book". */
  readonly what: string;
  readonly children: (data: Data) => ReactNode;
}

/** Shows what was read; until then that it is being read, or why it was not and how to try again. Old data stays in view. */
export const Loaded = <Data,>({ query, what, children }: LoadedProps<Data>) => {
  const { data, error, refetch, isFetching } = query;
  return (
    <>
      {error ? (
        <div className="screen-only pb-5">
          <Notice
            kind={data === undefined ? 'error' : 'caution'}
            title={sentenceOf(error)}
            action={
              <Button busy={isFetching} onClick={() => refetch()}>
                Try again
              </Button>
            }
          />
        </div>
      ) : null}
      {data === undefined ? error ? null : <Spinner label={`Reading ${what}`} /> : children(data)}
    </>
  );
};
