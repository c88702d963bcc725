import { QueryClient } from '@tanstack/react-query';
import { OfflineError, ServerFailedError } from './api-errors.ts';

/** Worth asking again without a person: the network or the server failed, not the question. */
function mayPass(error: Error): boolean {
  return error instanceof OfflineError || error instanceof ServerFailedError;
}

/** The one query client: what is read is fresh for 20 s; reads that may pass are asked twice more, writes never. */
export function createQueryClient(options: { readonly retryDelay_ms?: number } = {}): QueryClient {
  return new QueryClient({
    defaultOptions: {
      queries: {
        staleTime: 20_000,
        // Without a network a read fails at once and says so, instead of waiting without a word.
        networkMode: 'always',
        retry: (failures, error) => failures < 2 && mayPass(error),
        retryDelay: (failures) => (options.retryDelay_ms ?? 600) * 2 ** failures,
      },
      mutations: { networkMode: 'always', retry: false },
    },
  });
}
