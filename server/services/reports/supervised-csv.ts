import type { SupervisedStep } from '#shared/contracts/supervised.ts';
import { writeCsv } from './write-csv.ts';

const heads = ['When (UTC)', 'Melt', 'What', 'Sentence', 'Said', 'Signed by', 'PIN checked by'];

/** What an apprentice did under supervision as one CSV file. */
export const supervisedCsv = (name: string, steps: readonly SupervisedStep[]): string =>
  writeCsv([
    ['Done under supervision', name],
    [],
    heads,
    ...steps.map(({ at, meltCode, kind, sentence, words, signedBy, onDevice }) => [
      at,
      meltCode,
      kind === 'step' ? 'step' : 'departure',
      sentence,
      words,
      signedBy,
      onDevice ? 'the terminal' : 'the server',
    ]),
  ]);
