import * as Ariakit from '@ariakit/react';
import { useState } from 'react';
import { FieldFrame, type FieldTexts } from './field-frame.tsx';

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
  return (
    <FieldFrame {...frame}>
      {(ties) => (
        <Ariakit.ComboboxProvider
          value={value}
          setValue={onChange}
          resetValueOnHide={false}
          open={open}
          setOpen={setOpen}
        >
          <div className="field-box">
            <Ariakit.Combobox
              {...ties}
              autoSelect
              autoFocus={autoFocus ?? false}
              autoComplete="list"
              onKeyDown={(event) => {
                const chosen = event.currentTarget.getAttribute('aria-activedescendant') !== null;
                const [first] = items;
                if (event.key !== 'Enter' || !open || chosen || first === undefined) return;
                event.preventDefault();
                setOpen(false);
                onPick(first);
              }}
            />
          </div>
          <Ariakit.ComboboxPopover className="menu list-box" gutter={4} sameWidth portal>
            {items.map((item) => (
              <Ariakit.ComboboxItem
                key={item.id}
                value={item.label}
                setValueOnClick={false}
                focusOnHover
                className="menu-item list-item"
                onClick={() => {
                  onPick(item);
                }}
              >
                <span>{item.label}</span>
                {item.detail === undefined ? null : <span className="text-small text-soft">{item.detail}</span>}
              </Ariakit.ComboboxItem>
            ))}
            {items.length === 0 ? <p className="menu-label">{nothing}</p> : null}
          </Ariakit.ComboboxPopover>
        </Ariakit.ComboboxProvider>
      )}
    </FieldFrame>
  );
}
