/** Longer than any instrument's line: what does not end until then is noise, and is dropped. */
const longestLine = 120;

/** Cuts a stream of text into lines that end in CR, LF or both; empty lines and endless ones are left out. */
export const splitLines = (onLine: (line: string) => void): ((text: string) => void) => {
  let pending = '';
  let isNoise = false;
  const end = (): void => {
    if (!isNoise && pending.trim() !== '') onLine(pending);
    pending = '';
    isNoise = false;
  };
  return (text) => {
    for (const character of text) {
      if (character === '\r' || character === '\n') end();
      else if (pending.length < longestLine) pending += character;
      else isNoise = true;
    }
  };
};
