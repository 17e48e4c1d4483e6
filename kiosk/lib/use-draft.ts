import { useState } from 'react';

const read = <Value>(key: string, initial: Value): Value => {
  try {
    const kept = window.sessionStorage.getItem(key);
    return kept === null ? initial : (JSON.parse(kept) as Value);
  } catch {
    return initial;
  }
};

const keep = (key: string, value: unknown): void => {
  try {
    window.sessionStorage.setItem(key, JSON.stringify(value));
  } catch {
    // Blocked storage only costs the draft when the terminal locks or the page is loaded again.
  }
};

/** Something half filled in, kept through a lock or a reload of the page until this tab is closed. */
export const useDraft = <Value>(name: string, initial: Value): readonly [Value, (value: Value) => void] => {
  const key = `ladlemark.draft.${name}`;
  const [value, setValue] = useState(() => read(key, initial));
  const change = (next: Value): void => {
    keep(key, next);
    setValue(next);
  };
  return [value, change];
};

/** Forgets every draft of one card. */
export const forgetDrafts = (meltId: string): void => {
  try {
    for (const key of Object.keys(window.sessionStorage))
      if (key.startsWith('ladlemark.draft.') && key.includes(meltId)) window.sessionStorage.removeItem(key);
  } catch {
    // Blocked storage keeps no drafts.
  }
};
