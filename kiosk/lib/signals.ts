import { comfort, type SoundLevel } from './comfort.ts';

/** A note of a signal: when it begins, how long it sounds, s, and its pitch, Hz. */
interface Note {
  readonly at: number;
  readonly forS: number;
  readonly pitch: number;
}

/** The signals, told apart by their rhythm first and by their pitch second, so that a noisy bay still tells them apart. */
const signals = {
  /** Time runs short: three short notes. */
  soon: [0, 0.22, 0.44].map((at) => ({ at, forS: 0.12, pitch: 880 })),
  /** A limit has passed: two long low notes. */
  end: [0, 0.8].map((at) => ({ at, forS: 0.6, pitch: 392 })),
  /** Something is open now: two rising notes. */
  open: [
    { at: 0, forS: 0.25, pitch: 523 },
    { at: 0.3, forS: 0.45, pitch: 784 },
  ],
} as const satisfies Readonly<Record<string, readonly Note[]>>;

/** The name of a signal. */
export type SignalName = keyof typeof signals;

/** Loudness of a signal at each level, as a gain. */
const gains: Readonly<Record<SoundLevel, number>> = { off: 0, quiet: 0.08, loud: 0.6 };

/** How long a note takes to swell and to fade, s; without it a loudspeaker clicks. */
const edgeS = 0.015;

let audio: AudioContext | null = null;

const wake = (): void => {
  if (typeof AudioContext === 'undefined') return;
  audio ??= new AudioContext();
  if (audio.state === 'suspended') void audio.resume();
};

/** Lets signals sound from the first touch or key on; browsers keep a page silent before. */
export const wakeSignalsByTouch = (): (() => void) => {
  const kinds = ['pointerdown', 'keydown'] as const;
  for (const kind of kinds) window.addEventListener(kind, wake, { capture: true, passive: true });
  return () => {
    for (const kind of kinds) window.removeEventListener(kind, wake, { capture: true });
  };
};

const sound = (context: AudioContext, { at, forS, pitch }: Note, gain: number): void => {
  const from = context.currentTime + 0.05 + at;
  const tone = new OscillatorNode(context, { type: 'triangle', frequency: pitch });
  const volume = new GainNode(context, { gain: 0 });
  volume.gain.setValueAtTime(0, from);
  volume.gain.linearRampToValueAtTime(gain, from + edgeS);
  volume.gain.setValueAtTime(gain, from + forS - edgeS);
  volume.gain.linearRampToValueAtTime(0, from + forS);
  tone.connect(volume).connect(context.destination);
  tone.start(from);
  tone.stop(from + forS);
};

/** Sounds a signal at this device's level; silent when that is off, or before anyone has touched the page. */
export const playSignal = (name: SignalName): void => {
  const gain = gains[comfort().sound];
  if (!audio || gain === 0) return;
  for (const note of signals[name]) sound(audio, note, gain);
};
