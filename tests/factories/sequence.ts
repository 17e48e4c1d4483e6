let last = 0;

/** A number no other record of this test file has. */
export const nextNumber = (): number => (last += 1);
