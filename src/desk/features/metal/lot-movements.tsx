import { useInfiniteQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { Link } from 'react-router-dom';
import type { z } from 'zod';
import { correctMovementRequest, type Movement } from '#shared/contracts/ledger.ts';
import { movementsOfLotQuery, useCorrectMovement } from '#src/api/ledger.ts';
import { Button } from '#src/ui/button.tsx';
import { Loaded } from '#src/desk/parts/loaded.tsx';
import { useStudio } from '#src/desk/parts/use-studio.ts';
import { PlainTable } from '#src/desk/parts/plain-table.tsx';
import { CountersignFields, MassField, ReasonField } from './act-fields.tsx';
import { ActForm } from './act-form.tsx';
import { emptyMass, massReading, type MassValues } from './act-readings.ts';
import { movementNames, placeNames } from './lot-words.ts';
import { writeExactGrams } from './metal-mass.ts';
import { useActKey } from './use-act-key.ts';

const CorrectAct = ({ movement, onClose }: { readonly movement: Movement; readonly onClose: () => void }) => {
  const { units } = useStudio();
  const key = useActKey();
  const correct = useCorrectMovement(movement.id);
  const { kind, from, to, massG } = movement;
  return (
    <ActForm<MassValues, z.output<typeof correctMovementRequest>>
      title="Correct a movement"
      words={`${writeExactGrams(massG, units.mass)} ${movementNames[kind]}, from ${placeNames[from]} to ${placeNames[to]}. Nothing is rubbed out: a movement the other way puts it right.`}
      contract={correctMovementRequest}
      reading={massReading(key, units.mass, { mass: 'rightMassG', reason: 'reason', sign: 'must' })}
      defaults={emptyMass}
      fields={['mass', 'reason', 'sign']}
      submitWords="Correct it"
      send={correct.mutateAsync}
      onClose={onClose}
    >
      <MassField name="mass" label="What it should have been" hint="0 undoes it." />
      <ReasonField name="reason" label="What was wrong" />
      <CountersignFields hint="A second person signs, an owner or a caster." />
    </ActForm>
  );
};

const What = ({ movement }: { readonly movement: Movement }) => (
  <span className="inline-grid gap-0.5">
    <span>
      {movementNames[movement.kind]}
      {movement.melt ? (
        <>
          {' '}
          <Link to={`/melts/${movement.melt.id}`} className="font-extrabold underline underline-offset-4">
            {movement.melt.code}
          </Link>
        </>
      ) : null}
    </span>
    {movement.reason ? <span className="text-soft">{movement.reason}</span> : null}
  </span>
);

const Who = ({ movement }: { readonly movement: Movement }) => (
  <span className="inline-grid gap-0.5">
    <span>{movement.person}</span>
    {movement.countersignedBy ? (
      <span className="text-soft">signed by {movement.countersignedBy} too</span>
    ) : null}
  </span>
);

/** What happened to a lot's metal, newest first; what was wrong is corrected from here. */
export const LotMovements = ({ lotId }: { readonly lotId: string }) => {
  const { clock, units } = useStudio();
  const query = useInfiniteQuery(movementsOfLotQuery(lotId));
  const [wrong, setWrong] = useState<Movement | null>(null);
  return (
    <Loaded query={query} what="the movements">
      {({ pages }) => {
        const movements = pages.flatMap((page) => page.movements);
        return (
          <div className="grid grid-cols-1 gap-4">
            <PlainTable
              caption="Movements of the lot"
              align="left"
              heads={['When', 'Who', 'From', 'To', 'Mass', 'What', 'Put right']}
              figures={[4]}
              rows={movements.map((movement) => ({
                key: movement.id,
                cells: [
                  <span className="whitespace-nowrap">{clock.dayAndTime(movement.occurredAt)}</span>,
                  <Who movement={movement} />,
                  placeNames[movement.from],
                  placeNames[movement.to],
                  <span className="font-extrabold whitespace-nowrap">
                    {writeExactGrams(movement.massG, units.mass)}
                  </span>,
                  <What movement={movement} />,
                  movement.abilities.correct ? (
                    <button
                      type="button"
                      onClick={() => setWrong(movement)}
                      className="min-h-6 rounded-md font-extrabold underline decoration-2 underline-offset-4"
                    >
                      Correct
                      <span className="sr-only">
                        {' '}
                        {writeExactGrams(movement.massG, units.mass)} of{' '}
                        {clock.dayAndTime(movement.occurredAt)}
                      </span>
                    </button>
                  ) : null,
                ],
              }))}
            />
            {query.hasNextPage ? (
              <p>
                <Button busy={query.isFetchingNextPage} onClick={() => void query.fetchNextPage()}>
                  Earlier movements
                </Button>
              </p>
            ) : null}
            {wrong ? <CorrectAct movement={wrong} onClose={() => setWrong(null)} /> : null}
          </div>
        );
      }}
    </Loaded>
  );
};
