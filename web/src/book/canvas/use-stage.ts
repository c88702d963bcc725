import { Stage } from 'konva/lib/Stage';
import { useEffect, useState } from 'react';
import type { View } from '../interaction/camera.ts';

/** A stage as large as the view in the element it is given; gone with it. */
export function useStage(view: View): {
  readonly stage: Stage | null;
  readonly mount: (element: HTMLDivElement | null) => void;
} {
  const [element, mount] = useState<HTMLDivElement | null>(null);
  const [stage, setStage] = useState<Stage | null>(null);
  useEffect(() => {
    if (element === null) return;
    const made = new Stage({ container: element, listening: false, width: 1, height: 1 });
    setStage(made);
    return () => {
      setStage(null);
      made.destroy();
    };
  }, [element]);
  useEffect(() => {
    stage?.size({ width: view.width, height: view.height });
  }, [stage, view.width, view.height]);
  return { stage, mount };
}
