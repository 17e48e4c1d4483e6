import { useQuery } from '@tanstack/react-query';
import { terminalsQuery } from '#src/api/terminals.ts';
import { buttonClass } from '#src/ui/button-class.ts';
import { PageTitle } from '#src/ui/page-title.tsx';
import { Loaded } from '../../parts/loaded.tsx';
import { EnrolmentForm } from './enrolment-form.tsx';
import { TerminalTable } from './terminal-table.tsx';

/** The devices that stand at the furnaces, and how another becomes one. */
export const TerminalsPage = () => {
  const terminals = useQuery({ ...terminalsQuery, refetchInterval: 10_000 });
  return (
    <>
      <PageTitle
        title="Terminals"
        summary="Known devices at which people sign in by PIN and run pour cards."
        actions={
          <a href="/kiosk" className={buttonClass()}>
            Place this computer
          </a>
        }
      />
      <div className="grid items-start gap-x-14 gap-y-12 xl:grid-cols-[minmax(0,1fr)_400px]">
        <Loaded query={terminals} what="the terminals">
          {(list) => <TerminalTable terminals={list} />}
        </Loaded>
        <EnrolmentForm />
      </div>
    </>
  );
};
