import { useMemo, useState } from 'react';
import type { Melt } from '#shared/contracts/melt.ts';
import { formatPercent } from '#shared/lib/units.ts';
import { cx } from '#src/ui/cx.ts';
import { MeltBeam } from '#src/ui/melt-beam.tsx';
import { useStudio } from '../../parts/use-studio.ts';
import { balanceAt } from './balance-at.ts';

const solidWords = (share: number | null, celsius: number, liquidusC: number, solidusC: number): string => {
  if (celsius >= liquidusC) return 'all liquid';
  if (celsius <= solidusC) return 'all solid';
  return share === null ? 'partly solid' : `${formatPercent(share)} solid`;
};

/** The melt beam at one of the melt's readings; the last unless another is chosen. */
export const MeltBeamView = ({ melt }: { readonly melt: Melt }) => {
  const { degrees, temperature, clock, units } = useStudio();
  const { readings } = melt.state;
  const [chosenAt, setChosenAt] = useState<string | null>(null);
  const { figures } = melt.context;
  const { solidusC, liquidusC, asCastSolidusC, pourC } = figures;
  const balances = useMemo(
    () =>
      new Map(
        readings.map(({ temperatureC }) => [
          temperatureC,
          melt.rangeBasis === 'computed' ? balanceAt(melt.compositionWt, temperatureC) : null,
        ]),
      ),
    [readings, melt.rangeBasis, melt.compositionWt],
  );
  const shown = readings.find(({ at }) => at === chosenAt) ?? readings.at(-1) ?? null;
  const lowest = Math.min(asCastSolidusC ?? solidusC, ...readings.map(({ temperatureC }) => temperatureC));
  return (
    <div className="grid gap-4">
      <MeltBeam
        solidusC={solidusC}
        liquidusC={liquidusC}
        asCastSolidusC={asCastSolidusC !== null && asCastSolidusC < solidusC ? asCastSolidusC : undefined}
        windowC={{ low: pourC.low, high: pourC.high }}
        rangeC={{ low: lowest - 40, high: pourC.high + 40 }}
        readingC={shown?.temperatureC ?? null}
        balance={shown ? (balances.get(shown.temperatureC) ?? null) : null}
        format={degrees}
        unit={`°${units.temperature}`}
        className="mx-auto h-auto w-full max-w-[420px]"
      />
      {readings.length === 0 ? null : (
        <ul className="screen-only flex flex-wrap gap-2" aria-label="Readings">
          {readings.map(({ at, temperatureC }) => (
            <li key={at}>
              <button
                type="button"
                aria-pressed={at === shown?.at}
                onClick={() => setChosenAt(at)}
                className={cx(
                  'grid rounded-xl border-2 px-3 py-1.5 text-left leading-tight',
                  at === shown?.at ? 'border-ink bg-panel' : 'border-line',
                )}
              >
                <span className="font-black">{temperature(temperatureC)}</span>
                <span className="text-[15px] text-soft">
                  {clock.time(at)},{' '}
                  {solidWords(
                    balances.get(temperatureC)?.solidMassFraction ?? null,
                    temperatureC,
                    liquidusC,
                    solidusC,
                  )}
                </span>
              </button>
            </li>
          ))}
        </ul>
      )}
    </div>
  );
};
