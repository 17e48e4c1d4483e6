import { useState } from 'react';

/** A key made once for an act, so that sending it again does nothing twice. */
export const useActKey = (): string => useState(() => crypto.randomUUID())[0];
