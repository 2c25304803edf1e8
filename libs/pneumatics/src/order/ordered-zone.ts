/** What the order of a zone depends on. */
export interface OrderedZoneInput {
  id: string;
  number: number;
  /** Highest head over the air connection, ft. */
  elevationFt: number | null;
  /** Pipe from the air connection to the far end, ft. */
  distanceFt: number | null;
}
