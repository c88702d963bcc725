/** A key of the keyboard, beside the verb it does. Hidden from readers: the control says it in `aria-keyshortcuts`. */
export function Key({ children }: { readonly children: string }) {
  return (
    <kbd className="key figure" aria-hidden="true">
      {children}
    </kbd>
  );
}
