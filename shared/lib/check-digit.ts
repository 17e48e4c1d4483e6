const digitsOnly = /^\d+$/;

const product = (digits: string): number => {
  let carried = 10;
  for (const digit of digits) {
    const sum = (carried + Number(digit)) % 10 || 10;
    carried = (sum * 2) % 11;
  }
  return carried;
};

/** Check digit of a string of decimal digits by ISO 7064 MOD 11,10; throws a RangeError on anything but digits. */
export const checkDigit = (digits: string): string => {
  if (!digitsOnly.test(digits)) throw new RangeError('A check digit is computed from decimal digits only.');
  return String((11 - product(digits)) % 10);
};

/** Whether the last digit is the ISO 7064 MOD 11,10 check digit of those before it. */
export const hasValidCheckDigit = (digits: string): boolean =>
  digits.length > 1 && digitsOnly.test(digits) && checkDigit(digits.slice(0, -1)) === digits.slice(-1);
