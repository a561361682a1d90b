/** A list of numbers in one typed array that grows by doubling; reading is plain array access. */
export class FloatList {
  data = new Float64Array(64);
  length = 0;

  /** Makes room for so many more values, so that a hot loop may write without asking. */
  reserve(more: number): void {
    const needed = this.length + more;
    if (needed <= this.data.length) return;
    const grown = new Float64Array(Math.max(needed, 2 * this.data.length));
    grown.set(this.data.subarray(0, this.length));
    this.data = grown;
  }
}
