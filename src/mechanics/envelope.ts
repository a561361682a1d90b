/** Largest and smallest value of each column, and the mark of the row where it was first reached. */
export interface Envelope {
  readonly max: Float64Array;
  readonly maxMark: Float64Array;
  readonly min: Float64Array;
  readonly minMark: Float64Array;
}

/** An envelope of `columns` columns that holds nothing yet. */
export function createEnvelope(columns: number): Envelope {
  const column = () => new Float64Array(columns);
  return clearEnvelope({ max: column(), maxMark: column(), min: column(), minMark: column() });
}

/** Empties the envelope, and returns it. */
export function clearEnvelope(envelope: Envelope): Envelope {
  envelope.max.fill(Number.NEGATIVE_INFINITY);
  envelope.min.fill(Number.POSITIVE_INFINITY);
  return envelope;
}

/** Widens the envelope by `rows` rows of a row-major block; `marks` has one mark a row. */
export function widen(
  envelope: Envelope,
  values: Float64Array,
  marks: Float64Array,
  rows: number,
): void {
  const { max, maxMark, min, minMark } = envelope;
  const columns = max.length;
  for (let r = 0, at = 0; r < rows; r++) {
    for (let i = 0; i < columns; i++, at++) {
      const value = values[at];
      if (value > max[i]) {
        max[i] = value;
        maxMark[i] = marks[r];
      }
      if (value < min[i]) {
        min[i] = value;
        minMark[i] = marks[r];
      }
    }
  }
}

/** Widens `envelope` to cover `other` too. */
export function cover(envelope: Envelope, other: Envelope): void {
  for (let i = 0; i < other.max.length; i++) {
    if (other.max[i] > envelope.max[i]) {
      envelope.max[i] = other.max[i];
      envelope.maxMark[i] = other.maxMark[i];
    }
    if (other.min[i] < envelope.min[i]) {
      envelope.min[i] = other.min[i];
      envelope.minMark[i] = other.minMark[i];
    }
  }
}
