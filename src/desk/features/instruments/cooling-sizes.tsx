import type { FlaskSizeCooling } from '#shared/contracts/flask-cooling.ts';
import { StateMark } from '#src/ui/state-mark.tsx';
import { Disclosure } from '#src/desk/parts/panel.tsx';
import { PlainTable } from '#src/desk/parts/plain-table.tsx';
import { useStudio } from '#src/desk/parts/use-studio.ts';
import { CoolingPlot } from './cooling-plot.tsx';

const perMinute = (perSecond: number): string => (60 * perSecond).toFixed(4);

const summaryRow = ({ diameterMm, chosen, defaultPerSecond, fit }: FlaskSizeCooling) => ({
  key: String(diameterMm),
  cells: [
    `${diameterMm}\u00a0mm`,
    perMinute(defaultPerSecond),
    fit ? perMinute(fit.perSecond) : '–',
    fit?.standardError ? `± ${perMinute(fit.standardError)}` : '–',
    fit ? `${fit.readings} of ${fit.outings}` : '0',
    chosen.from === 'fitted' ? 'fitted' : 'default',
  ],
});

const Readings = ({ size }: { readonly size: FlaskSizeCooling }) => {
  const { degrees, units, clock } = useStudio();
  const why = (id: string, secondsOut: number): string =>
    size.fit?.leftOut.find((left) => left.outingId === id && left.secondsOut === secondsOut)?.why ?? '';
  return (
    <PlainTable
      caption={`Readings of ${size.diameterMm} mm flasks`}
      heads={['Flask', 'Taken', 'Seconds out', `°${units.temperature}`, 'Left out, because']}
      rows={size.outings.flatMap(({ id, flaskCode, at, readings }) =>
        readings.map(({ secondsOut, temperatureC }) => ({
          key: `${id} ${secondsOut} ${temperatureC}`,
          cells: [
            flaskCode,
            clock.dayAndTime(at),
            secondsOut.toFixed(0),
            degrees(temperatureC),
            why(id, secondsOut),
          ],
        })),
      )}
    />
  );
};

const Size = ({ size }: { readonly size: FlaskSizeCooling }) => (
  <section
    aria-label={`Flasks of ${size.diameterMm} mm`}
    className="grid content-start gap-3 break-inside-avoid"
  >
    <h3 className="text-[19px] font-black">{size.diameterMm} mm</h3>
    <StateMark
      state={size.chosen.from === 'fitted' ? 'ready' : 'wait'}
      text={size.chosen.from === 'fitted' ? 'cards use the fit' : 'cards use the default'}
      size="row"
    />
    <p className="max-w-[60ch] text-[15px] text-soft">{size.chosen.words}</p>
    <CoolingPlot size={size} />
    <Disclosure summary="The readings">
      <Readings size={size} />
    </Disclosure>
  </section>
);

/** The cooling constant of each flask size, default against fitted, with the readings drawn over both. */
export const CoolingSizes = ({ sizes }: { readonly sizes: readonly FlaskSizeCooling[] }) => (
  <div className="grid gap-10">
    <PlainTable
      caption="Cooling constants by flask size, share of the excess lost per minute"
      heads={[
        'Diameter',
        'Default per min',
        'Fitted per min',
        'Standard error',
        'Readings of flasks',
        'Cards use',
      ]}
      rows={sizes.map(summaryRow)}
    />
    <div className="grid gap-x-14 gap-y-10 lg:grid-cols-2">
      {sizes
        .filter(({ outings }) => outings.length > 0)
        .map((size) => (
          <Size key={size.diameterMm} size={size} />
        ))}
    </div>
    {sizes.every(({ outings }) => outings.length === 0) ? (
      <p className="text-soft">No flask’s temperature has been logged yet.</p>
    ) : null}
  </div>
);
