/** Tells the person who started the program one plain line. */
export type Say = (line: string) => void;

/** Says it on the standard output. */
export const sayOnStdout: Say = (line) => void process.stdout.write(`${line}\n`);
