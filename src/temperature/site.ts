/** Where and on which clock a record was taken: what the sun's place in the sky follows from. */
export interface Site {
  /** Degrees, north positive. */
  readonly latitude: number;
  /** Degrees, east positive. */
  readonly longitude: number;
  /** How far the record's own clock runs ahead of UTC [h], standard time all year. */
  readonly utcOffset: number;
}

/**
 * What a sample of irradiance stands for: the mean over the step that ends at its time, over the step that starts
 * there, or the moment itself.
 */
export type Stamp = 'end' | 'start' | 'instant';
