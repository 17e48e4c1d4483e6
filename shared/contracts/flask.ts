/** A flask: a steel cylinder used hundreds of times. */
export interface Flask {
  readonly id: string;
  readonly code: string;
  readonly diameterMm: number;
  readonly heightMm: number;
  /** The casting now in it, or null when it is free. */
  readonly openCastingId: string | null;
}
