import type { Changes } from '@embertally/shared/survey/change';
import { patchFaults, rowFaults } from '@embertally/shared/survey/row-fault';
import type { InputFault } from '../fault.ts';

/** Every fault of the rows and fields in a change set, at its place in the body. */
export function changeFaults(changes: Changes): InputFault[] {
  return changes.flatMap((change, index): InputFault[] => {
    const at = `/changes/${index}`;
    if (change.after === null) {
      return change.before === null
        ? [{ pointer: at, code: 'CHANGE_EMPTY', message: 'This change neither makes nor removes anything.' }]
        : [];
    }
    if (change.before === null) {
      const own = change.after['id'];
      const mixed = own === change.id ? [] : [{ pointer: '/id', message: 'The row must carry the id of its change.' }];
      return [...mixed, ...rowFaults(change.kind, change.after)].map(({ pointer, message }) => ({
        pointer: `${at}/after${pointer}`,
        code: 'ROW_DOES_NOT_FIT',
        message,
      }));
    }
    return patchFaults(change.kind, change.after).map(({ pointer, message }) => ({
      pointer: `${at}/after${pointer}`,
      code: 'FIELD_DOES_NOT_FIT',
      message,
    }));
  });
}
