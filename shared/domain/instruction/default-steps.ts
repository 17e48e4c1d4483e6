import type { InstructionStep, SafetySign, StepConditions } from './instruction-step.ts';

const always: StepConditions = { methods: [], families: [], roles: [], hazards: [] };
const apprentice: StepConditions = { ...always, roles: ['apprentice'] };

const check = (
  key: string,
  before: InstructionStep['before'],
  sign: SafetySign | null,
  sentence: string,
  when: Partial<StepConditions> = {},
): InstructionStep => ({
  kind: 'check',
  key,
  before,
  sign,
  sentence,
  when: { ...always, ...when },
  maySkip: false,
});

const say = (
  key: string,
  before: InstructionStep['before'],
  sentence: string,
  when: Partial<StepConditions> = {},
): InstructionStep => ({ kind: 'say', key, before, sentence, when: { ...always, ...when }, maySkip: true });

const countersign = (key: string, before: InstructionStep['before'], sentence: string): InstructionStep => ({
  kind: 'countersign',
  key,
  before,
  sentence,
  when: apprentice,
  maySkip: false,
});

const guard: readonly InstructionStep[] = [
  check('face', 'guard', 'face-shield', 'Face shield down.'),
  check('hands', 'guard', 'heat-gloves', 'Heat gloves and apron on, natural-fibre clothes, closed shoes.'),
  check('eyes', 'guard', 'shaded-glasses', 'Shaded glasses at hand for looking into the melt.'),
  check(
    'dry',
    'guard',
    'dry-charge',
    'Metal, crucible and tools are dry and warm: water under metal explodes.',
  ),
  check('air', 'guard', 'ventilation', 'Extraction is running.'),
  check(
    'hot',
    'guard',
    'hot-surface',
    'The way from furnace to mould is clear. A hot flask looks like a cold one.',
  ),
  check(
    'zinc',
    'guard',
    'ventilation',
    'This alloy holds zinc, which fumes when it is overheated: extraction close over the melt.',
    { hazards: ['zinc'] },
  ),
  check(
    'nickel',
    'guard',
    'nickel',
    'This alloy holds nickel, which sensitises skin: gloves for grain and casting, no dust.',
    { hazards: ['nickel'] },
  ),
];

const charge: readonly InstructionStep[] = [
  say(
    'crucible-family',
    'charge',
    'Take the crucible that is kept for this alloy family, and look whether it is sound.',
  ),
  say('silver-cover', 'charge', 'Silver takes up oxygen when it is liquid: cover gas, flux or graphite.', {
    families: ['silver'],
  }),
  say(
    'palladium-mould',
    'charge',
    'Palladium white gold is poured hot: see that the mould is of an investment that allows it.',
    { hazards: ['palladium'] },
  ),
  say(
    'nickel-mould',
    'charge',
    'Nickel white gold suffers from carbon and sulphur: the mould must be burnt out clean.',
    {
      hazards: ['nickel'],
    },
  ),
];

const beforeHeat: readonly InstructionStep[] = [
  check('apprentice-face', 'melt', 'face-shield', 'Face shield down before the heat goes on.', apprentice),
  check(
    'apprentice-feed',
    'melt',
    'dry-charge',
    'Nothing cold or damp goes into liquid metal. Warm what you add at the rim first.',
    apprentice,
  ),
];

const beforeFlaskOut: readonly InstructionStep[] = [
  say('vacuum-ready', 'flask-out', 'Vacuum on, seal clean and in its place.', { methods: ['vacuum'] }),
  check('arm-locked', 'flask-out', null, 'Arm balanced, wound and locked; lid and shield at hand.', {
    methods: ['centrifugal'],
  }),
  check(
    'apprentice-hands',
    'flask-out',
    'heat-gloves',
    'Tongs in hand, gloves on, face shield down.',
    apprentice,
  ),
  check(
    'apprentice-way',
    'flask-out',
    'hot-surface',
    'The way to the machine is clear, and everyone near knows that a pour comes.',
    apprentice,
  ),
  countersign(
    'apprentice-pour',
    'flask-out',
    'A caster looks at melt, machine and clothing, and signs for the pour.',
  ),
];

const beforeQuench: readonly InstructionStep[] = [
  check(
    'apprentice-steam',
    'quench',
    'steam',
    'Stand back, face shield down, tongs: the flask goes under with a burst of steam.',
    apprentice,
  ),
];

/** The steps a new studio begins with, by method, alloy and role: usual cautions of the trade (common practice, no source); the owner edits them. */
export const defaultSteps: readonly InstructionStep[] = [
  ...guard,
  ...charge,
  ...beforeHeat,
  ...beforeFlaskOut,
  ...beforeQuench,
];
