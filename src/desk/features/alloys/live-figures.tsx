import { useDeferredValue, useMemo } from 'react';
import { useFormContext, useWatch } from 'react-hook-form';
import { markedMetal, type AlloyFamily } from '#shared/domain/alloy/alloy-family.ts';
import type { AlloyFigures } from '#shared/domain/alloy/alloy-figures.ts';
import { figuresOfComposition } from '#shared/domain/alloy/figures-of-composition.ts';
import { parseDecimal } from '#shared/lib/decimal.ts';
import type { Result } from '#shared/lib/result.ts';
import { DefinitionList } from '#src/ui/definition-list.tsx';
import type { StudioWriting } from '#src/desk/parts/use-studio.ts';
import type { AlloyFormValues } from '#src/desk/parts/alloy-form-values.ts';
import { sumOfParts } from '#src/desk/parts/composition-fields.tsx';
import { elementName, writeWt } from '#src/desk/parts/element-names.ts';
import { tidySymbol, type PartValues } from '#src/desk/parts/read-parts.ts';

const readable = (parts: readonly PartValues[]): Readonly<Record<string, number>> =>
  Object.fromEntries(
    parts.flatMap(({ symbol, wt }) => {
      const number = parseDecimal(wt);
      return number.ok && symbol.trim() !== '' ? [[tidySymbol(symbol), number.value] as const] : [];
    }),
  );

/** Today's figures of what is typed, or why there are none yet. */
export const liveFigures = (parts: readonly PartValues[]): Result<AlloyFigures> => {
  const sum = sumOfParts(parts);
  if (Math.abs(sum - 100) > 0.005) {
    return {
      ok: false,
      error: `The figures appear when the parts come to 100 wt%; they come to ${writeWt(sum)}.`,
    };
  }
  const outcome = figuresOfComposition(readable(parts), null);
  return outcome.ok ? { ok: true, value: outcome.value.figures } : outcome;
};

const finenessHeld = (parts: readonly PartValues[], family: AlloyFamily | ''): string => {
  if (family === '') return 'choose a family';
  const metal = markedMetal(family);
  return `${((readable(parts)[metal] ?? 0) * 10).toFixed(1)} of ${elementName(metal)}`;
};

const items = (figures: AlloyFigures, { temperature }: StudioWriting) => [
  { term: 'All liquid above', value: temperature(figures.liquidusC) },
  { term: 'All solid below', value: temperature(figures.solidusC) },
  {
    term: 'As cast, melts again at',
    value: figures.asCastSolidusC === null ? 'not computed' : temperature(figures.asCastSolidusC),
  },
  { term: 'Dissolves above', value: figures.solvusC === null ? 'no solvus' : temperature(figures.solvusC) },
  { term: 'Density', value: `${figures.densityGPerCm3.toFixed(2)} g/cm³` },
];

/** The figures of what is typed so far, computed in the browser; typing never waits for them. */
export const LiveFigures = ({ studio }: { readonly studio: StudioWriting }) => {
  const { control } = useFormContext<AlloyFormValues>();
  const [parts, family, isMeasured] = useWatch({ control, name: ['parts', 'family', 'isMeasured'] });
  const settled = useDeferredValue(parts);
  const figures = useMemo(() => liveFigures(settled), [settled]);
  return (
    <section
      aria-labelledby="live-figures"
      className="grid content-start gap-3 rounded-[18px] border-2 border-line bg-panel p-5 lg:sticky lg:top-5"
    >
      <h2 id="live-figures" className="text-[19px] font-black">
        What it computes to
      </h2>
      {figures.ok ? (
        <DefinitionList items={items(figures.value, studio)} />
      ) : (
        <p className="text-soft">
          {figures.error}
          {isMeasured ? ' The measured range will be used.' : ''}
        </p>
      )}
      <DefinitionList items={[{ term: 'Fineness held', value: finenessHeld(settled, family) }]} />
    </section>
  );
};
