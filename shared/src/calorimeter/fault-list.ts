import type { CalorimeterFault } from './calorimeter-fault.ts';

const SHOWN = 100;

/** Faults in the order of their lines; the first hundred in words, the rest as a number. */
export class FaultList {
  readonly shown: CalorimeterFault[] = [];
  count = 0;

  add(line: number | null, code: string, message: () => string): void {
    this.count += 1;
    if (this.shown.length < SHOWN) this.shown.push({ line, code, message: message() });
  }

  /** How many are not in `shown`. */
  get more(): number {
    return this.count - this.shown.length;
  }
}
