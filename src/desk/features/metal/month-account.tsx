import type { MonthOfMetal } from '#shared/domain/metal/reconcile.ts';
import { cx } from '#src/ui/cx.ts';
import { useStudio } from '#src/desk/parts/use-studio.ts';
import { capitalised, elementName } from '#src/desk/parts/element-names.ts';
import { writeExactMass } from './metal-mass.ts';
import type { MonthLine } from './month-words.ts';

/** Props of {@link MonthAccount}. */
export interface MonthAccountProps {
  readonly caption: string;
  readonly lines: readonly MonthLine[];
  readonly metals: readonly MonthOfMetal[];
  readonly total: MonthOfMetal;
}

const headOf = (element: string): string => {
  if (element === 'all') return 'All metal';
  return element === 'other' ? 'Not named' : capitalised(elementName(element));
};

/** A month's account, a line for each way metal came and went, a column for each metal. */
export const MonthAccount = ({ caption, lines, metals, total }: MonthAccountProps) => {
  const { units } = useStudio();
  const columns = [...metals, total];
  return (
    <div role="region" aria-label={caption} tabIndex={0} className="overflow-x-auto rounded-md">
      <table className="w-full table-fixed">
        <caption className="pb-2 text-left text-[19px] font-black">
          {caption}, {units.mass}
        </caption>
        <thead>
          <tr>
            <td className="w-[26%] border-b-[3px] border-ink" />
            {columns.map(({ element }) => (
              <th
                key={element}
                scope="col"
                className="border-b-[3px] border-ink py-1.5 pl-6 text-right text-[15px] font-extrabold text-soft"
              >
                {headOf(element)}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {lines.map(({ name, of, isBalance }) => (
            <tr key={name} className={cx(isBalance && 'font-black')}>
              <th
                scope="row"
                className={cx(
                  'border-b-2 border-line py-2 pr-4 text-left',
                  isBalance ? 'font-black' : 'font-bold',
                )}
              >
                {name}
              </th>
              {columns.map((metal) => (
                <td
                  key={metal.element}
                  className={cx(
                    'border-b-2 border-line py-2 pl-6 text-right whitespace-nowrap',
                    of(metal) === 0 && 'text-soft',
                  )}
                >
                  {writeExactMass(of(metal), units.mass)}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
};
