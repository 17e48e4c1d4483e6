import { formatPercent } from '#shared/lib/units.ts';
import type { Section } from '#shared/metallurgy/index.ts';
import type { StudioWriting } from '../../parts/use-studio.ts';
import type { FreezingStudy } from './alloy-study.ts';
import { capitalised, elementName, writeWt } from './element-names.ts';
import { freezingRows } from './freezing-readings.ts';
import { Disclosure } from './panel.tsx';
import { PlainTable } from './plain-table.tsx';

/** The freezing curves in figures. */
export const FreezingTable = ({
  study,
  studio,
}: {
  readonly study: FreezingStudy;
  readonly studio: StudioWriting;
}) => (
  <Disclosure summary="The freezing curve as a table">
    <PlainTable
      caption="Share solid while freezing"
      heads={['Temperature', 'Slowly (lever)', 'As cast (Scheil)']}
      rows={freezingRows(study.lever.points, study.scheil.points).map(({ temperatureC, lever, scheil }) => ({
        key: String(temperatureC),
        cells: [
          studio.temperature(temperatureC),
          `${formatPercent(lever)} solid`,
          `${formatPercent(scheil)} solid`,
        ],
      }))}
    />
  </Disclosure>
);

const everyNth = 10;

/** The melting lines of a section in figures, and its invariant. */
export const SectionTable = ({
  section,
  studio,
}: {
  readonly section: Section;
  readonly studio: StudioWriting;
}) => {
  const of = (name: string) => section.boundaries.find((line) => line.name === name)?.points ?? [];
  const solidus = new Map(of('solidus').map(({ x, temperatureC }) => [x, temperatureC]));
  const step = (section.xMax - section.xMin) / everyNth;
  const isShown = (x: number): boolean => Math.abs(x / step - Math.round(x / step)) < 1e-6;
  const metal = capitalised(elementName(section.xElement));
  return (
    <Disclosure summary="The diagram as a table">
      <PlainTable
        caption="Melting lines of the section"
        heads={[`${metal}, wt%`, 'All solid below', 'All liquid above']}
        rows={of('liquidus')
          .filter(({ x }) => isShown(x))
          .map(({ x, temperatureC }) => {
            const low = solidus.get(x);
            return {
              key: String(x),
              cells: [
                writeWt(x),
                low === undefined ? 'not computed' : studio.temperature(low),
                studio.temperature(temperatureC),
              ],
            };
          })}
      />
    </Disclosure>
  );
};
