import { register } from 'tsx/esm/api';

// A worker thread does not inherit the loader its process was started with: register it, then load the TypeScript.
register();
await import('./estimate-worker.ts');
