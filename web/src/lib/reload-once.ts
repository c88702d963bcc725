const KEY = 'embertally.reloaded-at';
const GUARD_MS = 30_000;

/**
 * Reloads the page unless it was already reloaded for this reason within the last 30 s, so that a script which is
 * really gone shows its error page instead of reloading for ever. Returns whether it reloads.
 */
export function reloadOnce(
  ports: { readonly storage: Pick<Storage, 'getItem' | 'setItem'>; readonly reload: () => void },
  now_ms: number,
): boolean {
  const last = Number(ports.storage.getItem(KEY) ?? Number.NaN);
  if (Number.isFinite(last) && now_ms - last < GUARD_MS) return false;
  ports.storage.setItem(KEY, String(now_ms));
  ports.reload();
  return true;
}
