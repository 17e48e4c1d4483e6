import type { SectionStudy } from './alloy-study.ts';
import { elementName, writeWt } from './element-names.ts';

const titleOf = ({ section: { request } }: SectionStudy): string =>
  request.kind === 'carat'
    ? `Section at ${writeWt(request.goldWt)} wt% gold, silver against copper`
    : `The ${request.elements.map(elementName).join('-')} system`;

/** What a section shows, for those who cannot see it. */
export const sectionSentence = (
  study: SectionStudy,
  x: number,
  temperature: (celsius: number) => string,
): string => {
  const { invariants, xElement } = study.section;
  const invariant = invariants.map(({ name, temperatureC, liquidX }) =>
    name === 'eutectic'
      ? ` Three phases meet at ${temperature(temperatureC)} with ${writeWt(Number(liquidX.toFixed(1)))} wt% ${elementName(xElement)} in the liquid.`
      : ` Lowest melting at ${temperature(temperatureC)} with ${writeWt(Number(liquidX.toFixed(1)))} wt% ${elementName(xElement)}, solid and liquid alike.`,
  );
  return `${titleOf(study)}. This alloy stands at ${writeWt(x)} wt% ${elementName(xElement)}.${invariant.join('')} A table of it follows.`;
};
