/** What an instrument measures with: a thermocouple in the melt or flask, a pyrometer that looks at it, or a balance. */
export const instrumentKinds = ['thermometer', 'pyrometer', 'balance'] as const;
/** One kind of instrument. */
export type InstrumentKind = (typeof instrumentKinds)[number];

/** A kind's name in words. */
export const instrumentKindNames: Readonly<Record<InstrumentKind, string>> = {
  thermometer: 'thermometer',
  pyrometer: 'pyrometer',
  balance: 'balance',
};

/** Whether an instrument reads temperatures, and so is checked against freezing points. */
export const readsTemperature = (kind: InstrumentKind): boolean => kind !== 'balance';
