interface SourceNoteProps {
  readonly source: { readonly title: string; readonly locator: string; readonly fromMemory: boolean };
}

/** Where a row's figures were taken from, and whether it was written down from memory. */
export function SourceNote({ source }: SourceNoteProps) {
  return (
    <span className="block max-w-[44ch] text-small text-soft">
      {source.title}; {source.locator}
      {source.fromMemory ? <em> (from memory)</em> : null}
    </span>
  );
}
