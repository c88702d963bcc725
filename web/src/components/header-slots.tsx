import { createContext, useContext, useMemo, useState, type ReactNode } from 'react';
import { createPortal } from 'react-dom';

/** `trail`: where we are, after the mark. `actions`: what can be done or is so, before the person. */
export type HeaderSlotName = 'trail' | 'actions';

interface Slots {
  readonly nodes: Readonly<Record<HeaderSlotName, HTMLElement | null>>;
  readonly mount: Readonly<Record<HeaderSlotName, (node: HTMLElement | null) => void>>;
}

const SlotsContext = createContext<Slots | null>(null);

/** Lets a page put its own words into the one header that stays while pages change. */
export function HeaderSlots({ children }: { readonly children: ReactNode }) {
  const [trail, mountTrail] = useState<HTMLElement | null>(null);
  const [actions, mountActions] = useState<HTMLElement | null>(null);
  const slots = useMemo<Slots>(
    () => ({ nodes: { trail, actions }, mount: { trail: mountTrail, actions: mountActions } }),
    [trail, actions],
  );
  return <SlotsContext value={slots}>{children}</SlotsContext>;
}

/** Where the header shows what pages put into a slot. */
export function HeaderSlotTarget({ name, className }: { readonly name: HeaderSlotName; readonly className?: string }) {
  const slots = useContext(SlotsContext);
  return <div ref={slots?.mount[name]} className={className} />;
}

/** What a page puts into a slot of the header. Shows nothing where there is no header (a page on its own in a test). */
export function HeaderSlot({ name, children }: { readonly name: HeaderSlotName; readonly children: ReactNode }) {
  const node = useContext(SlotsContext)?.nodes[name] ?? null;
  return node === null ? null : createPortal(children, node);
}
