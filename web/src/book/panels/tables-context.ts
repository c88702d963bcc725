import { createContext, useContext } from 'react';

/** The tables of the Book, by what their rows are. `room`: everything known of the room in hand. */
export type TablePart = 'rooms' | 'room' | 'openings' | 'contents' | 'limits' | 'storeys';

export interface TablesChoice {
  readonly part: TablePart;
  /** Shows the tables on the left page, opened at a part. */
  readonly open: (part: TablePart) => void;
}

export const TablesContext = createContext<TablesChoice>({ part: 'rooms', open: () => undefined });

/** Opens the tables, where everything on the plan can be read and changed without it. */
export function useOpenTables(): (part: TablePart) => void {
  return useContext(TablesContext).open;
}
