/** One clear sentence and a non-zero exit: the only way the start and test commands give up. */
export class Stop extends Error {}

/** @param {unknown} error the reason a command failed; a full disk is named, because every other message hides it. */
export function asStop(error, what) {
  const text = error instanceof Error ? `${error.message} ${error.stderr ?? ''}` : String(error);
  if (/ENOSPC|No space left on device/i.test(text)) {
    return new Stop(
      `The disk is full, so ${what} stopped; nothing was lost. Free some space and run the command again.`,
    );
  }
  if (error instanceof Stop) return error;
  return new Stop(`${what} failed: ${text.trim().split('\n').slice(-6).join(' ').slice(0, 600)}`);
}

export function say(line) {
  process.stdout.write(`${line}\n`);
}

/** Runs a command's main function; a {@link Stop} prints its sentence, anything else its stack. */
export async function command(main) {
  try {
    await main();
  } catch (error) {
    if (error instanceof Stop) process.stderr.write(`\n${error.message}\n`);
    else process.stderr.write(`\nSomething unexpected happened:\n${error?.stack ?? error}\n`);
    process.exit(1);
  }
}
