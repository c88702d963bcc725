import type { MaterialFault } from './material-fault.ts';

/** Thrown inside a derivation where a draft gives no material; `deriveMaterial` turns it into faults. */
export class DraftRefused extends Error {
  override readonly name = 'DraftRefused';

  constructor(readonly faults: readonly MaterialFault[]) {
    super(faults.map(({ message }) => message).join(' '));
  }

  /** One fault at one place. */
  static at(pointer: string, code: string, message: string): DraftRefused {
    return new DraftRefused([{ pointer, code, message }]);
  }
}
