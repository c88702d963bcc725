interface StripVerbProps {
  readonly label: string;
  readonly onPress: () => void;
}

/** Something to do with the picked thing. */
export function StripVerb({ label, onPress }: StripVerbProps) {
  return (
    <button type="button" className="strip-verb" onClick={onPress}>
      {label}
    </button>
  );
}
