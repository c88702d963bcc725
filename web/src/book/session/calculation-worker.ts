import { estimateRoom } from '@embertally/shared/tally/estimate-room';
import { estimateSpread } from '@embertally/shared/tally/estimate-spread';
import type { CalculationMessage, CalculationTask, CalculationValue } from './calculation-message.ts';

/**
 * Runs as a thread of its own: takes one task at a time, tells how far it is and hands the value over. It is stopped by
 * ending the thread.
 */
const say = (message: CalculationMessage): void => {
  postMessage(message);
};

/** Each word of progress draws the page anew. */
const PROGRESS_EVERY_ms = 100;

function calculate({ kind, input }: CalculationTask): CalculationValue[CalculationTask['kind']] {
  switch (kind) {
    case 'uncertainty': {
      let said = 0;
      const onSampled = (fraction: number) => {
        if (performance.now() - said < PROGRESS_EVERY_ms) return;
        said = performance.now();
        say({ kind: 'progress', fraction });
      };
      const tally = estimateRoom(input, { workings: true, spread: false, onSampled });
      return { uncertainty: tally.uncertainty, band: tally.load.band, missing: tally.missing };
    }
    case 'spread':
      return estimateSpread(input, { workings: true });
  }
}

addEventListener('message', ({ data }: MessageEvent<CalculationTask>) => {
  try {
    say({ kind: 'done', value: calculate(data) });
  } catch (error) {
    say({ kind: 'failed', message: error instanceof Error ? error.message : String(error) });
  }
});
