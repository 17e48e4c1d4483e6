import { skipToken, useQuery, type UseQueryResult } from '@tanstack/react-query';
import { ENGINE_VERSION } from '#shared/metallurgy/index.ts';
import { askStudy } from './ask-study.ts';
import type { StudyAnswer, StudyInput, StudyName } from './alloy-study.ts';

/** One study of an alloy, computed once and kept; nothing is asked while `input` is null. */
export const useStudy = <Name extends StudyName>(
  name: Name,
  input: StudyInput<Name> | null,
): UseQueryResult<StudyAnswer<Name>> =>
  useQuery({
    queryKey: ['alloy-study', ENGINE_VERSION, name, input],
    queryFn: input === null ? skipToken : () => askStudy(name, input),
    // Computed in the browser: it never grows old and needs no network.
    staleTime: Infinity,
    networkMode: 'always',
    retry: false,
  });
