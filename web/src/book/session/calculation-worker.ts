import { estimateRoom } from '@embertally/shared/tally/estimate-room';
import type { CalculationMessage, CalculationTask, CalculationValue } from './calculation-message.ts';

/**
 * Runs as a thread of its own: takes one task at a time, tells how far it is and hands the value over. It is stopped by
 * ending the thread.
 */
const say = (message: CalculationMessage): void => {
  postMessage(message);
};

function calculate({ kind, input }: CalculationTask): CalculationValue[CalculationTask['kind']] {
  switch (kind) {
    case 'uncertainty': {
      const tally = estimateRoom(input, { workings: true, spread: false });
      return { uncertainty: tally.uncertainty, band: tally.load.band, missing: tally.missing };
    }
    case 'spread': {
      const { spread, missing } = estimateRoom(input, { workings: true });
      return { spread, missing };
    }
  }
}

addEventListener('message', ({ data }: MessageEvent<CalculationTask>) => {
  try {
    say({ kind: 'done', value: calculate(data) });
  } catch (error) {
    say({ kind: 'failed', message: error instanceof Error ? error.message : String(error) });
  }
});
