import { alloyFamilies, alloyFamilyNames } from '#shared/domain/alloy/alloy-family.ts';
import { castingMethodNames, castingMethods } from '#shared/domain/casting/casting-method.ts';
import { CoolingTable, type CoolingTableProps } from './cooling-table.tsx';
import { LimitFields } from './limit-fields.tsx';
import { ProcessFields } from './process-fields.tsx';
import { RangeTable } from './range-table.tsx';
import { SettingsSection } from './settings-section.tsx';
import { SourceField } from './source-field.tsx';
import { StudioBasics } from './studio-basics.tsx';

const methods = castingMethods.map((key) => ({ key, name: castingMethodNames[key] }));
const families = alloyFamilies.map((key) => ({ key, name: alloyFamilyNames[key] }));

/** Every field of the settings, in the order in which a card uses them. */
export const StudioFields = ({ control, ...part }: CoolingTableProps) => (
  <>
    <SettingsSection id="studio" title="Studio" about="What it is called and how it reads and weighs.">
      <StudioBasics {...part} />
    </SettingsSection>
    <SettingsSection
      id="limits"
      title="Limits"
      about="Where a pour card stops, asks again, or marks a departure."
    >
      <LimitFields {...part} />
    </SettingsSection>
    <SettingsSection
      id="superheat"
      title="Superheat"
      about="How far over the liquidus the melt is poured, by process and thinnest section."
    >
      <RangeTable caption="Over the liquidus, °C" table="superheat" rows={methods} {...part} />
      <SourceField of="superheat" label="Source of the superheats" {...part} />
    </SettingsSection>
    <SettingsSection
      id="flask"
      title="Flask temperature"
      about="How hot the mould is held in the furnace, by family of alloy and thinnest section."
    >
      <RangeTable caption="In the furnace, °C" table="flask" rows={families} {...part} />
      <SourceField of="flask" label="Source of the flask temperatures" {...part} />
    </SettingsSection>
    <SettingsSection
      id="cooling"
      title="Flask cooling"
      about="The share of its excess over the room that a mould loses each minute; it sets the time from furnace to pour. A card takes the nearest diameter."
    >
      <CoolingTable control={control} {...part} />
      <SourceField of="flaskCooling" label="Source of the cooling rates" {...part} />
    </SettingsSection>
    <SettingsSection id="process" title="Other figures" about="Used by every card, each with its source.">
      <ProcessFields {...part} />
    </SettingsSection>
  </>
);
