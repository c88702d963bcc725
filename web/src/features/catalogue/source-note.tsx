interface SourceNoteProps {
  readonly source: { readonly title: string; readonly locator: string; readonly fromMemory: boolean };
}

/** Where a row's figures were taken from, and whether that was read again. */
export function SourceNote({ source }: SourceNoteProps) {
  return (
    <span className="block max-w-[44ch] text-small text-soft">
      {source.title}; {source.locator}
      {source.fromMemory ? <em> (not read again when written down)</em> : null}
    </span>
  );
}
