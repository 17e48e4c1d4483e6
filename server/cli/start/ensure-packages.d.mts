export function ensurePackages(root: string, say: (line: string) => void): Promise<void>;
