import { parseArgs } from 'node:util';
import { benchCards } from './bench-cards.ts';
import { benchCharge } from './charge.ts';
import { benchClients } from './bench-clients.ts';
import { benchCoolingCurve } from './cooling-curve.ts';
import { benchEngine } from './engine.ts';

const prefixed = (prefix: string, figures: Record<string, number>): Record<string, number> =>
  Object.fromEntries(Object.entries(figures).map(([key, value]) => [`${prefix}.${key}`, value]));

/** What can be measured, by the name `--only` knows it by. */
const parts: Readonly<Record<string, () => Promise<Record<string, number>>>> = {
  engine: async () => prefixed('engine', await benchEngine()),
  charge: async () => prefixed('charge', await benchCharge()),
  curves: benchCoolingCurve,
  clients: benchClients,
  cards: benchCards,
};

const { values } = parseArgs({
  options: { json: { type: 'boolean', default: false }, only: { type: 'string' } },
});

const chosen = values.only?.split(',') ?? Object.keys(parts);
const unknown = chosen.find((name) => !(name in parts));
if (unknown !== undefined) {
  console.error(`--only knows ${Object.keys(parts).join(', ')}, but not "${unknown}".`);
  process.exit(2);
}

const figures: Record<string, number> = {};
for (const name of chosen) Object.assign(figures, await parts[name]?.());

if (values.json) console.log(JSON.stringify(figures));
else {
  const width = Math.max(...Object.keys(figures).map((key) => key.length));
  for (const [key, value] of Object.entries(figures))
    console.log(`${key.padEnd(width)}  ${value.toPrecision(4)}`);
}
