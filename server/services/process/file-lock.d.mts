export function withFileLock<T>(path: string, task: () => Promise<T>, onWait?: () => void): Promise<T>;
