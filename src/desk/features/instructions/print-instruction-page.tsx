import { useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { instructionQuery } from '#src/api/instructions.ts';
import { useNow } from '#src/lib/use-now.ts';
import { Loaded } from '#src/desk/parts/loaded.tsx';
import { PrintFrame } from '#src/desk/parts/print-frame.tsx';
import { useStudio } from '#src/desk/parts/use-studio.ts';
import { InstructionSheet } from './instruction-sheet.tsx';
import { InstructionStateMark } from './instruction-state-mark.tsx';

const advice =
  'To hang beside the furnace or to be read before a shift. The terminal asks for the revision that its card began with; paper is never newer than the day it was printed.';

/** A revision of the work instruction on paper. */
export const PrintInstructionPage = () => {
  const { instructionId = '' } = useParams();
  const { clock } = useStudio();
  const printed = clock.dayAndTime(new Date(useNow(60_000)).toISOString());
  const query = useQuery(instructionQuery(instructionId));
  return (
    <PrintFrame
      title="Work instruction"
      advice={advice}
      backTo={`/instructions/${instructionId}`}
      backName="The instruction"
    >
      <Loaded query={query} what="the work instruction">
        {(instruction) => (
          <article className="paper max-w-[820px] p-8 not-print:outline-1 not-print:outline-line print:p-0">
            <header className="flex flex-wrap items-baseline justify-between gap-x-6 gap-y-1 pb-5">
              <h2 className="text-[26px] font-black">{instruction.content.title}</h2>
              <InstructionStateMark revision={instruction} />
              <p className="w-full">
                Revision {instruction.number}
                {instruction.approvedBy ? `, approved by ${instruction.approvedBy}` : ''}
                {instruction.approvedAt ? `, ${clock.dayAndTime(instruction.approvedAt)}` : ''}. Printed{' '}
                {printed}.
              </p>
            </header>
            <InstructionSheet instruction={instruction.content} />
          </article>
        )}
      </Loaded>
    </PrintFrame>
  );
};
