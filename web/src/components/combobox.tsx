import { type KeyboardEvent, useId, useRef, useState } from 'react';
import { FieldFrame, type FieldTexts } from './field-frame.tsx';
import { useListBelow } from './use-list-below.ts';

export interface ComboboxItem {
  readonly id: string;
  readonly label: string;
  /** A second, quieter line below: a group. */
  readonly detail?: string;
}

interface ComboboxProps extends FieldTexts {
  readonly id?: string;
  /** What is typed. */
  readonly value: string;
  readonly onChange: (value: string) => void;
  /** What fits what is typed, best first: the caller searches. */
  readonly items: readonly ComboboxItem[];
  readonly onPick: (item: ComboboxItem) => void;
  /** Said when nothing fits. */
  readonly nothing: string;
  readonly autoFocus?: boolean;
}

/** A box to type in with a list of what fits below it. Arrow keys choose, Enter takes, Escape closes. */
export function Combobox({ value, onChange, items, onPick, nothing, autoFocus, ...frame }: ComboboxProps) {
  // What was typed before the list was there is answered as soon as it is.
  const [open, setOpen] = useState(autoFocus === true && value !== '');
  // The best one is chosen until another is.
  const [moved, setMoved] = useState(0);
  const box = useRef<HTMLDivElement>(null);
  const list = useRef<HTMLDivElement>(null);
  const listId = useId();
  useListBelow(box, list, open);
  const chosen = Math.min(moved, items.length - 1);

  const take = (item: ComboboxItem): void => {
    setOpen(false);
    onPick(item);
  };
  const choose = (index: number): void => {
    setMoved(index);
    list.current?.querySelectorAll('[role=option]')[index]?.scrollIntoView({ block: 'nearest' });
  };
  const onKeyDown = (event: KeyboardEvent): void => {
    const item = items[chosen];
    switch (event.key) {
      case 'ArrowDown':
      case 'ArrowUp':
        event.preventDefault();
        if (!open) setOpen(true);
        else if (items.length > 0)
          choose((chosen + (event.key === 'ArrowDown' ? 1 : -1) + items.length) % items.length);
        return;
      case 'Enter':
        if (!open || item === undefined) return;
        event.preventDefault();
        take(item);
        return;
      case 'Escape':
        if (!open) return;
        // It closes the list and not what the list stands in.
        event.preventDefault();
        event.stopPropagation();
        setOpen(false);
    }
  };

  return (
    <FieldFrame {...frame}>
      {(ties) => (
        <>
          <div className="field-box" ref={box}>
            <input
              {...ties}
              type="text"
              role="combobox"
              value={value}
              autoFocus={autoFocus ?? false}
              autoComplete="off"
              spellCheck={false}
              aria-autocomplete="list"
              aria-haspopup="listbox"
              aria-expanded={open}
              aria-controls={listId}
              aria-activedescendant={open && chosen >= 0 ? `${listId}-${chosen}` : undefined}
              onChange={(event) => {
                onChange(event.currentTarget.value);
                setMoved(0);
                setOpen(true);
              }}
              onClick={() => {
                setOpen(true);
              }}
              onBlur={() => {
                setOpen(false);
              }}
              onKeyDown={onKeyDown}
            />
          </div>
          {open && (
            <div ref={list} popover="manual" className="menu list-box">
              <div role="listbox" id={listId} aria-label={frame.label}>
                {items.map((item, index) => (
                  <div
                    key={item.id}
                    role="option"
                    id={`${listId}-${index}`}
                    aria-selected={index === chosen}
                    data-active-item={index === chosen ? 'true' : undefined}
                    className="menu-item list-item"
                    onPointerMove={() => {
                      setMoved(index);
                    }}
                    onPointerDown={(event) => {
                      // The focus stays in the box, and with it the list stays open until the press is over.
                      event.preventDefault();
                    }}
                    onMouseDown={(event) => {
                      event.preventDefault();
                    }}
                    onClick={() => {
                      take(item);
                    }}
                  >
                    <span>{item.label}</span>
                    {item.detail === undefined ? null : <span className="text-small text-soft">{item.detail}</span>}
                  </div>
                ))}
              </div>
              {items.length === 0 ? <p className="menu-label">{nothing}</p> : null}
            </div>
          )}
        </>
      )}
    </FieldFrame>
  );
}
