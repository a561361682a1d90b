/** A column of numbers whose length is not known beforehand. */
export class GrowingColumn {
  private values: Float64Array;
  private count = 0;

  /** @param expected about how many numbers there will be */
  constructor(expected: number) {
    this.values = new Float64Array(Math.max(16, Math.ceil(expected)));
  }

  get length(): number {
    return this.count;
  }

  /** The number pushed last. */
  get last(): number {
    return this.values[this.count - 1];
  }

  push(value: number): void {
    if (this.count === this.values.length) {
      const longer = new Float64Array(2 * this.count);
      longer.set(this.values);
      this.values = longer;
    }
    this.values[this.count++] = value;
  }

  /** The numbers so far, not copied. */
  taken(): Float64Array {
    return this.values.subarray(0, this.count);
  }
}
