import type { AlloyRevision } from '#shared/contracts/alloy.ts';
import type { AlloyFamily } from '#shared/domain/alloy/alloy-family.ts';
import type { QuenchRule } from '#shared/domain/alloy/quench-rule.ts';
import { fromCelsius, type TemperatureUnit } from '#shared/lib/units.ts';
import { emptyPart, partsOfAssay, type PartValues } from './read-parts.ts';

/** Everything the alloy form holds, as it is typed. */
export interface AlloyFormValues {
  readonly name: string;
  readonly family: AlloyFamily | '';
  readonly parts: PartValues[];
  readonly fineness: string;
  readonly quench: {
    /** Minutes after the pour. */
    readonly earliest: string;
    /** Minutes after the pour; empty where there is no latest. */
    readonly latest: string;
    readonly medium: QuenchRule['medium'];
    readonly why: string;
    readonly source: string;
  };
  readonly isMeasured: boolean;
  /** Temperatures in the studio's unit. */
  readonly measured: {
    readonly solidus: string;
    readonly liquidus: string;
    readonly density: string;
    readonly source: string;
  };
  readonly note: string;
}

/** The form of an alloy not yet known. */
export const emptyAlloyForm: AlloyFormValues = {
  name: '',
  family: '',
  parts: [emptyPart, emptyPart],
  fineness: '',
  quench: { earliest: '', latest: '', medium: 'water', why: '', source: '' },
  isMeasured: false,
  measured: { solidus: '', liquidus: '', density: '', source: '' },
  note: '',
};

const minutes = (seconds: number): string => String(Number((seconds / 60).toFixed(2)));

/** The form filled in from a revision, to draft the next one from it; the note starts empty. */
export const formOfRevision = (
  { name, family }: { readonly name: string; readonly family: AlloyFamily },
  revision: AlloyRevision,
  unit: TemperatureUnit,
): AlloyFormValues => {
  const { compositionWt, toleranceWt, quench, measured } = revision;
  const degrees = (celsius: number): string => String(Number(fromCelsius(celsius, unit).toFixed(1)));
  return {
    ...emptyAlloyForm,
    name,
    family,
    parts: partsOfAssay({ compositionWt, toleranceWt }),
    fineness: String(revision.fineness),
    quench: {
      earliest: minutes(quench.earliestS),
      latest: quench.latestS === null ? '' : minutes(quench.latestS),
      medium: quench.medium,
      why: quench.why,
      source: quench.source,
    },
    isMeasured: measured !== null,
    measured: measured
      ? {
          solidus: degrees(measured.solidusC),
          liquidus: degrees(measured.liquidusC),
          density: String(measured.densityGPerCm3),
          source: measured.source,
        }
      : emptyAlloyForm.measured,
  };
};
