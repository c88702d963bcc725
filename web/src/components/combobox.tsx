import * as Ariakit from '@ariakit/react';
import { FieldFrame, type FieldTexts } from './field-frame.tsx';

export interface ComboboxItem {
  readonly id: string;
  readonly label: string;
  /** A second, quieter line end: a group, a figure with its unit. */
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
  return (
    <FieldFrame {...frame}>
      {(ties) => (
        <Ariakit.ComboboxProvider value={value} setValue={onChange} resetValueOnHide={false}>
          <div className="field-box">
            <Ariakit.Combobox {...ties} autoSelect autoFocus={autoFocus ?? false} autoComplete="list" />
          </div>
          <Ariakit.ComboboxPopover className="menu list-box" gutter={4} sameWidth portal>
            {items.map((item) => (
              <Ariakit.ComboboxItem
                key={item.id}
                value={item.label}
                setValueOnClick={false}
                className="menu-item"
                onClick={() => {
                  onPick(item);
                }}
              >
                <span>{item.label}</span>
                {item.detail === undefined ? null : <span className="figure text-small text-soft">{item.detail}</span>}
              </Ariakit.ComboboxItem>
            ))}
            {items.length === 0 ? <p className="menu-label">{nothing}</p> : null}
          </Ariakit.ComboboxPopover>
        </Ariakit.ComboboxProvider>
      )}
    </FieldFrame>
  );
}
