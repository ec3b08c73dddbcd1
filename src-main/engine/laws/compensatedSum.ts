/** A running sum whose rounding does not grow with the number of terms (Neumaier 1974). */
export class CompensatedSum {
  private sum = 0
  private lost = 0

  add(term: number): void {
    const next = this.sum + term
    this.lost += Math.abs(this.sum) >= Math.abs(term) ? this.sum - next + term : term - next + this.sum
    this.sum = next
  }

  get value(): number {
    return this.sum + this.lost
  }
}
