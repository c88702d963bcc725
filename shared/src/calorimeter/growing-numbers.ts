/** Numbers of a file whose length is not known: eight bytes each, without a list of a million objects. */
export class GrowingNumbers {
  private values = new Float64Array(1024);
  length = 0;

  push(value: number): void {
    if (this.length === this.values.length) {
      const wider = new Float64Array(this.values.length * 2);
      wider.set(this.values);
      this.values = wider;
    }
    this.values[this.length] = value;
    this.length += 1;
  }

  /** What was pushed, without the room kept for more. */
  taken(): Float64Array {
    return this.values.slice(0, this.length);
  }
}
