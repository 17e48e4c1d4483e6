import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { Link } from 'react-router-dom';
import type { Flask } from '#shared/contracts/flask.ts';
import { castingsQuery, flasksQuery } from '#src/api/castings.ts';
import { buttonClass } from '#src/ui/button-class.ts';
import { Icon } from '#src/ui/icon.tsx';
import { Notice } from '#src/ui/notice.tsx';
import { PageTitle } from '#src/ui/page-title.tsx';
import { Loaded } from '../../parts/loaded.tsx';
import { FlaskTile } from './flask-tile.tsx';
import { LargeCode } from './large-code.tsx';

const usage = (flasks: readonly Flask[]): string => {
  const inUse = flasks.filter(({ openCastingId }) => openCastingId !== null).length;
  return `${flasks.length} flasks, ${inUse} in use. The code names the flask for all its life; hold one to a terminal’s camera, or print its plate.`;
};

/** Every flask with its code to scan, what is in it, and its plate. */
export const FlasksPage = () => {
  const flasks = useQuery(flasksQuery);
  const castings = useQuery(castingsQuery());
  const [large, setLarge] = useState<string | null>(null);
  return (
    <>
      <PageTitle
        title="Flasks"
        summary={flasks.data ? usage(flasks.data) : undefined}
        actions={
          <Link to="/print/flasks" className={buttonClass()}>
            <Icon name="print" />
            Print all plates
          </Link>
        }
      />
      <Loaded query={flasks} what="the flasks">
        {(list) =>
          list.length === 0 ? (
            <Notice kind="empty" title="The studio has no flask yet.">
              Flasks show here with their codes as soon as they are entered.
            </Notice>
          ) : (
            <ul className="grid grid-cols-[repeat(auto-fill,minmax(min(100%,400px),1fr))] gap-x-10">
              {list.map((flask) => (
                <FlaskTile
                  key={flask.id}
                  flask={flask}
                  casting={castings.data?.find(({ id }) => id === flask.openCastingId)}
                  onEnlarge={() => setLarge(flask.code)}
                />
              ))}
            </ul>
          )
        }
      </Loaded>
      {large === null ? null : <LargeCode code={large} onClose={() => setLarge(null)} />}
    </>
  );
};
