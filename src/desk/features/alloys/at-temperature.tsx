import type { EquilibriumState, Outcome } from '#shared/metallurgy/index.ts';
import { formatPercent } from '#shared/lib/units.ts';
import { Notice } from '#src/ui/notice.tsx';
import type { StudioWriting } from '../../parts/use-studio.ts';
import { beamOfState } from './beam-of-state.ts';
import { capitalised } from './element-names.ts';
import { PhaseBeam } from './phase-beam.tsx';
import { writeDegrees } from './snap-temperature.ts';
import { freedomSentence, phasesSentence, phaseWords } from './phase-words.ts';

/** Props of {@link AtTemperature}. */
export interface AtTemperatureProps {
  readonly atC: number;
  readonly state: Outcome<EquilibriumState>;
  readonly compositionWt: Readonly<Record<string, number>>;
  readonly studio: StudioWriting;
  /** False where the phases lie off the drawn section. */
  readonly inPlane: boolean;
}

const PhaseTable = ({ state }: { readonly state: EquilibriumState }) => {
  const elements = Object.keys(state.chemicalPotentials);
  return (
    <table className="w-full text-[15px]">
      <caption className="sr-only">The phases at this temperature, in wt%</caption>
      <thead>
        <tr className="text-soft">
          <th scope="col" className="py-1 text-left font-extrabold">
            Phase
          </th>
          <th scope="col" className="py-1 text-right font-extrabold">
            Share
          </th>
          {elements.map((element) => (
            <th key={element} scope="col" className="py-1 pl-3 text-right font-extrabold">
              {element}, %
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {state.phases.map((phase) => (
          <tr key={phase.name} className="border-t-2 border-line">
            <th scope="row" className="py-1 text-left font-bold">
              {capitalised(phaseWords(phase))}
            </th>
            <td className="py-1 text-right font-extrabold">{formatPercent(phase.massFraction)}</td>
            {elements.map((element) => (
              <td key={element} className="py-1 pl-3 text-right">
                {(phase.wt[element] ?? 0).toFixed(1)}
              </td>
            ))}
          </tr>
        ))}
      </tbody>
    </table>
  );
};

const Answer = ({
  state,
  compositionWt,
  inPlane,
}: { readonly state: EquilibriumState } & Pick<AtTemperatureProps, 'compositionWt' | 'inPlane'>) => (
  <>
    <p className="leading-snug text-soft">
      {phasesSentence(state)} {freedomSentence(state)}
    </p>
    <PhaseBeam pair={beamOfState(state, compositionWt)} isLiquid={state.phases[0]?.name === 'liquid'} />
    <PhaseTable state={state} />
    {inPlane ? null : (
      <p className="pt-1 text-[15px] leading-snug text-soft">
        Solid and liquid do not hold the same gold, so the beam leaves the drawn section: the picture shows
        its shadow.
      </p>
    )}
  </>
);

/** What stands at the chosen temperature: phases, what is free, the beam, and each phase's composition. */
export const AtTemperature = ({ atC, state, compositionWt, studio, inPlane }: AtTemperatureProps) => (
  <section aria-labelledby="at-temperature" className="grid gap-1.5">
    <h2 id="at-temperature" className="text-[19px] font-black">
      At {writeDegrees(atC, studio.units.temperature)} °{studio.units.temperature}
    </h2>
    {state.withinModel ? (
      <Answer state={state} compositionWt={compositionWt} inPlane={inPlane} />
    ) : (
      <Notice kind="info" title="Not computed here">
        {state.reason}
      </Notice>
    )}
  </section>
);
