import { type ReactNode, useMemo, useState } from 'react';
import { useBookSession } from '../session/use-book-session.ts';
import { type TablePart, TablesContext } from './tables-context.ts';

/** Lets any page of the Book open the tables at the part it means. */
export function TablesProvider({ children }: { readonly children: ReactNode }) {
  const session = useBookSession();
  const [part, setPart] = useState<TablePart>('rooms');
  const choice = useMemo(
    () => ({
      part,
      open: (next: TablePart) => {
        setPart(next);
        session.showTables(true);
      },
    }),
    [part, session],
  );
  return <TablesContext value={choice}>{children}</TablesContext>;
}
