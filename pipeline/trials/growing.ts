/** Numbers as they come, in one block that doubles when it is full. */
export class Growing {
  private block = new Float64Array(256);
  length = 0;

  push(value: number): void {
    if (this.length === this.block.length) {
      const larger = new Float64Array(2 * this.length);
      larger.set(this.block);
      this.block = larger;
    }
    this.block[this.length] = value;
    this.length += 1;
  }

  at(k: number): number {
    return this.block[k]!;
  }

  toArray(): Float64Array {
    return this.block.slice(0, this.length);
  }
}
