import type { Plugin } from 'vite';

const WORKER = /new URL\(\s*'(\.\/[\w./-]+-worker\.ts)',\s*import\.meta\.url\s*\)/g;

/**
 * Builds a worker as one more entry of the client instead of a bundle of its own, so that the engine and its catalogue
 * are one file for both and are fetched once. Code keeps the usual form `new Worker(new URL('./x-worker.ts',
 * import.meta.url))`, which is what the development server serves.
 */
export function shareWorkerChunks(): Plugin {
  return {
    name: 'share-worker-chunks',
    apply: 'build',
    enforce: 'pre',
    async transform(code, importer) {
      let shared = code;
      for (const [whole, path] of code.matchAll(WORKER)) {
        const worker = path === undefined ? null : await this.resolve(path, importer);
        if (worker === null) continue;
        const chunk = this.emitFile({ type: 'chunk', id: worker.id });
        shared = shared.replace(whole, `import.meta.ROLLUP_FILE_URL_${chunk}`);
      }
      return shared === code ? null : { code: shared, map: null };
    },
  };
}
