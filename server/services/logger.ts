/** Where the server writes what the person who runs it should know; details must hold no secrets. */
export interface Logger {
  readonly info: (message: string, details?: Readonly<Record<string, unknown>>) => void;
  readonly warn: (message: string, details?: Readonly<Record<string, unknown>>) => void;
  readonly error: (message: string, details?: Readonly<Record<string, unknown>>) => void;
}

/** A logger that writes one line an entry: the time (UTC), the level, the sentence, and the details as JSON. */
export const createLogger = (write: (line: string) => void): Logger => {
  const at =
    (level: string) =>
    (message: string, details?: Readonly<Record<string, unknown>>): void => {
      const rest = details && Object.keys(details).length > 0 ? ` ${JSON.stringify(details)}` : '';
      write(`${new Date().toISOString()} ${level} ${message}${rest}\n`);
    };
  return { info: at('info'), warn: at('warn'), error: at('error') };
};
