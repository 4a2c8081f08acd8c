/** Slowest step between two keys of an instrument, ms; nobody types so fast, a held-down key repeats slower. */
const deviceStepMs = 28;
const fewestKeys = 3;

/**
 * Tells an instrument that types like a keyboard from a hand: the steps between its keys are short, nearly all of them. One of these
 * watches the keys of one field; a pause starts anew.
 */
export class KeyBurst {
  private steps: number[] = [];
  private last = Number.NEGATIVE_INFINITY;

  key(atMs: number, repeated: boolean): void {
    const step = atMs - this.last;
    this.last = atMs;
    if (repeated || step > 500) this.steps = [];
    else this.steps.push(step);
  }

  /** Whether what was typed just now came from an instrument. */
  isDevice(): boolean {
    if (this.steps.length < fewestKeys - 1) return false;
    const sorted = [...this.steps].sort((a, b) => a - b);
    return sorted[Math.floor(sorted.length / 2)]! < deviceStepMs;
  }

  forget(): void {
    this.steps = [];
    this.last = Number.NEGATIVE_INFINITY;
  }
}
