import { randomUUID } from 'node:crypto';
import { setTimeout as wait } from 'node:timers/promises';
import { parseArgs } from 'node:util';
import type { CurvePoint } from '#shared/domain/cooling-curve/curve-point.ts';
import { playMelt } from '#shared/domain/instrument/play-melt.ts';
import { writeThermometerLine } from '#shared/domain/instrument/read-thermometer-line.ts';
import { thermocoupleTypes, type ThermocoupleType } from '#shared/domain/instrument/thermocouple.ts';
import { meltingRange, type Composition } from '#shared/metallurgy/index.ts';

const USAGE = `Usage: npm run --silent instrument -- [options]
Plays a melt as a thermometer would tell it: heated, held, left to cool along the alloy's computed curve.
  --alloy "Ag 92.5 Cu 7.5"   composition in wt%
  --type K                   thermocouple: ${thermocoupleTypes.join(', ')}
  --superheat 70             held so far above the liquidus, °C
  --hold 60                  for so many seconds
  --cooling 1                the liquid's cooling rate, °C/s
  --noise 0.5                standard deviation of the readings, °C
  --seed 1                   the same number plays the same noise
  --speed 1                  seconds of the melt for each second of yours; 0 prints all at once
  --csv                      writes a table of time and temperature instead of lines
  --http URL --token TOKEN   sends to a server instead of writing lines
Lines go to the standard output, to be piped into a serial port.`;

const { values } = parseArgs({
  options: {
    alloy: { type: 'string', default: 'Ag 92.5 Cu 7.5' },
    type: { type: 'string', default: 'K' },
    superheat: { type: 'string', default: '70' },
    hold: { type: 'string', default: '60' },
    cooling: { type: 'string', default: '1' },
    noise: { type: 'string', default: '0.5' },
    seed: { type: 'string', default: '1' },
    speed: { type: 'string', default: '1' },
    csv: { type: 'boolean', default: false },
    http: { type: 'string' },
    token: { type: 'string' },
    help: { type: 'boolean', default: false },
  },
});

/** Ends with one sentence for the person who asked. */
const giveUp = (sentence: string): never => {
  console.error(sentence);
  process.exit(2);
};

const numberOf = (
  name: 'superheat' | 'hold' | 'cooling' | 'noise' | 'seed' | 'speed',
  least: number,
): number => {
  const value = Number(values[name]);
  return Number.isFinite(value) && value >= least
    ? value
    : giveUp(`--${name} must be a number of at least ${least}, not ${JSON.stringify(values[name])}.`);
};

const compositionOf = (text: string): Composition => {
  const words = text.trim().split(/\s+/);
  const pairs = words.flatMap((word, k) => (k % 2 === 0 ? [[word, Number(words[k + 1])] as const] : []));
  return Object.fromEntries(pairs);
};

const typeOf = (text: string): ThermocoupleType =>
  thermocoupleTypes.find((type) => type === text) ??
  giveUp(`--type is one of ${thermocoupleTypes.join(', ')}, not ${JSON.stringify(text)}.`);

const played = (): readonly CurvePoint[] => {
  const composition = compositionOf(values.alloy);
  const range = meltingRange(composition);
  if (!range.withinModel) return giveUp(range.reason);
  const play = {
    composition,
    superheatC: numberOf('superheat', 5),
    holdS: Math.round(numberOf('hold', 0)),
    heatingRate: 5,
    coolingRate: numberOf('cooling', 0.05),
    noiseC: numberOf('noise', 0),
    seed: numberOf('seed', 0),
  };
  const { liquidusC, solidusC, asCastSolidusC } = range;
  return (
    playMelt(play, { liquidusC, endC: asCastSolidusC ?? solidusC }) ??
    giveUp('The model does not hold this alloy.')
  );
};

/** Sends one batch until the server has it: the key makes a second delivery harmless. */
const send = async (url: URL, token: string, batch: readonly CurvePoint[]): Promise<void> => {
  const body = JSON.stringify({
    key: randomUUID(),
    readings: batch.map(({ seconds, temperatureC }) => ({ temperatureC, sequence: seconds })),
  });
  const response = await fetch(new URL('/api/instrument-readings', url), {
    method: 'POST',
    headers: { Authorization: `Bearer ${token}`, 'Content-Type': 'application/json' },
    body,
  });
  if (response.ok) return;
  const { title } = (await response.json().catch(() => ({}))) as { title?: string };
  giveUp(title ?? `The server answered ${response.status}.`);
};

const urlOf = (text: string): URL =>
  URL.canParse(text) ? new URL(text) : giveUp('--http wants an address, such as http://127.0.0.1:4380.');

const play = async (): Promise<void> => {
  const type = typeOf(values.type);
  const speed = numberOf('speed', 0);
  const points = played();
  const url = values.http === undefined ? null : urlOf(values.http);
  const token = url && (values.token ?? giveUp('--http wants the token of an instrument: --token TOKEN.'));
  // Fast play is sent in batches of a second of ours, as a logger with a memory would.
  const step = url && speed !== 1 ? Math.max(1, Math.round(speed === 0 ? 300 : speed)) : 1;
  if (values.csv && !url) console.log('time s;temperature °C');
  for (let k = 0; k < points.length; k += step) {
    const batch = points.slice(k, k + step);
    if (url && token) await send(url, token, batch);
    else
      for (const { seconds, temperatureC } of batch)
        console.log(
          values.csv
            ? `${seconds};${temperatureC.toFixed(1)}`
            : writeThermometerLine(type, { temperatureC }, seconds),
        );
    if (speed > 0) await wait((1000 * batch.length) / speed);
  }
};

// Whoever reads the lines may stop before the melt does, as `head` does.
process.stdout.on('error', (error: NodeJS.ErrnoException) => {
  if (error.code === 'EPIPE') process.exit(0);
  throw error;
});

if (values.help) console.log(USAGE);
else await play();
