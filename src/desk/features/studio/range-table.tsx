import type { Path } from 'react-hook-form';
import { sectionBandNames, sectionBands, type SectionBand } from '#shared/domain/casting/section-band.ts';
import { faultAt, type FormPart } from './form-parts.ts';
import type { StudioValues } from './studio-values.ts';

type Table = 'superheat' | 'flask';

/** One row of a table of ranges. */
export interface RangeRow {
  readonly key: string;
  readonly name: string;
}

/** Props of {@link RangeTable}. */
export interface RangeTableProps extends FormPart {
  readonly caption: string;
  readonly table: Table;
  readonly rows: readonly RangeRow[];
}

interface CellProps extends FormPart {
  readonly base: string;
  /** The cell in words: "vacuum-assisted, under 1 mm". */
  readonly name: string;
}

const box =
  'h-10 w-[4.6rem] rounded-lg border-2 border-soft bg-panel px-2 text-right font-extrabold aria-invalid:border-[3px] aria-invalid:border-ember';

const RangeCell = ({ base, name, register, errors }: CellProps) => {
  const [low, high] = [`${base}.low`, `${base}.high`] as Path<StudioValues>[] as [
    Path<StudioValues>,
    Path<StudioValues>,
  ];
  const fault = faultAt(errors, low) ?? faultAt(errors, high);
  const end = (path: Path<StudioValues>, word: string) => (
    <input
      inputMode="decimal"
      autoComplete="off"
      aria-label={`${name}, ${word}, °C`}
      aria-invalid={faultAt(errors, path) ? true : undefined}
      aria-describedby={fault ? `${base}-fault` : undefined}
      className={box}
      {...register(path)}
    />
  );
  return (
    <td className="border-b-2 border-line py-2 pr-5 align-top">
      <span className="flex items-center gap-1.5 whitespace-nowrap">
        {end(low, 'from')}
        <span className="text-soft">to</span>
        {end(high, 'to')}
      </span>
      <p
        id={`${base}-fault`}
        role="alert"
        className={fault ? 'mt-1 max-w-[11rem] font-extrabold text-ember' : 'hidden'}
      >
        {fault}
      </p>
    </td>
  );
};

/** Ranges of temperature by row and thinnest section, each end to be typed. */
export const RangeTable = ({ caption, table, rows, register, errors }: RangeTableProps) => (
  <div className="overflow-x-auto">
    <table className="w-full border-separate border-spacing-0">
      <caption className="pb-2 text-left font-extrabold text-soft">{caption}</caption>
      <thead>
        <tr>
          <td className="border-b-[3px] border-ink" />
          {sectionBands.map((band: SectionBand) => (
            <th
              key={band}
              scope="col"
              className="border-b-[3px] border-ink py-1 pr-5 text-left text-[15px] font-extrabold text-soft"
            >
              {sectionBandNames[band]}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {rows.map(({ key, name }) => (
          <tr key={key}>
            <th
              scope="row"
              className="border-b-2 border-line py-3.5 pr-5 text-left align-top font-extrabold first-letter:uppercase"
            >
              {name}
            </th>
            {sectionBands.map((band) => (
              <RangeCell
                key={band}
                base={`processTables.${table}.${key}.${band}`}
                name={`${name}, ${sectionBandNames[band]}`}
                register={register}
                errors={errors}
              />
            ))}
          </tr>
        ))}
      </tbody>
    </table>
  </div>
);
