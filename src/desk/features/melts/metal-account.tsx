import type { Melt } from '#shared/contracts/melt.ts';
import { chargedG } from '#shared/domain/pour-card/card-state.ts';
import { useStudio } from '../../parts/use-studio.ts';

interface Part {
  readonly name: string;
  readonly grams: number;
  readonly fill: string;
}

interface BarProps {
  readonly title: string;
  readonly parts: readonly Part[];
  readonly wholeG: number;
}

const Bar = ({ title, parts, wholeG }: BarProps) => {
  const { mass } = useStudio();
  return (
    <div className="grid gap-1.5">
      <p className="flex justify-between font-extrabold">
        <span className="text-soft">{title}</span>
        <span>{mass(wholeG)}</span>
      </p>
      <div className="flex h-9 overflow-hidden rounded-lg border-[2.5px] border-ink" aria-hidden="true">
        {parts.map(({ name, grams, fill }) => (
          <div
            key={name}
            className={`${fill} border-ink not-first:border-l-2`}
            style={{ width: `${(grams / wholeG) * 100}%` }}
          />
        ))}
      </div>
      <ul className="flex flex-wrap gap-x-5">
        {parts.map(({ name, grams }) => (
          <li key={name}>
            <span className="text-soft">{name}</span> <span className="font-extrabold">{mass(grams)}</span>
          </li>
        ))}
      </ul>
    </div>
  );
};

/** Metal in over metal out, drawn to one scale: what was charged, and what became of it. */
export const MetalAccount = ({ melt }: { readonly melt: Melt }) => {
  const { mass } = useStudio();
  const { charge, closing } = melt.state;
  const inG = chargedG(melt.state);
  if (inG === 0) return <p className="text-soft">Nothing has been weighed in yet.</p>;
  const charged = [
    { name: 'casting grain', grams: charge.grain, fill: 'bg-brass-soft' },
    { name: 'returns', grams: charge.returns, fill: 'bg-silver-fill' },
  ].filter(({ grams }) => grams > 0);
  return (
    <div className="grid gap-5">
      <Bar title={`In, of ${mass(melt.context.plannedMetalG)} planned`} parts={charged} wholeG={inG} />
      {closing ? (
        <>
          <Bar
            title="Out"
            wholeG={inG}
            parts={[
              { name: 'casting', grams: closing.castMassG, fill: 'bg-brass-soft' },
              { name: 'button', grams: closing.buttonMassG, fill: 'bg-silver-fill' },
              { name: 'loss', grams: closing.lossMassG, fill: 'bg-ember-fill' },
            ]}
          />
          <p className="text-[15px] text-soft">
            The casting is what is left of the metal in after button and loss;{' '}
            {((closing.lossMassG / inG) * 100).toFixed(1)} % was lost.
          </p>
        </>
      ) : (
        <p className="text-soft">What came out is weighed when the card is closed.</p>
      )}
    </div>
  );
};
