export function processIdentity(pid?: number): string;
export function isProcessAlive(identity: string): boolean;
