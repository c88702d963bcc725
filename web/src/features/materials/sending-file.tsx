import { useId } from 'react';
import { Button } from '../../components/button.tsx';

interface SendingFileProps {
  readonly name: string;
  /** 0 to 1. */
  readonly share: number;
  readonly onStop: () => void;
}

/** How far a file has left this device, and a way to stop it. */
export function SendingFile({ name, share, onStop }: SendingFileProps) {
  const id = useId();
  return (
    <div className="grid w-full max-w-96 gap-2">
      <label htmlFor={id}>Sending {name}</label>
      <progress id={id} max={1} value={share} className="w-full" />
      <div>
        <Button size="small" onClick={onStop}>
          Stop
        </Button>
      </div>
    </div>
  );
}
