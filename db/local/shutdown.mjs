const PARENT_POLL_MS = 500;
const EXIT_CODES = { SIGINT: 130, SIGTERM: 143, SIGHUP: 129 };

/**
 * Turns every way of being told to stop into one abort signal: Ctrl-C, SIGTERM, a closed terminal, and the
 * end of npm. A SIGTERM to `npm start` kills npm but not this process, so its parent is watched.
 * @returns {{ signal: AbortSignal, exitCode: () => number }}
 */
export function listenForShutdown() {
  const controller = new AbortController();
  let exitCode = 0;
  const stop = (code) => {
    if (exitCode === 0) exitCode = code;
    controller.abort();
  };
  for (const [name, code] of Object.entries(EXIT_CODES)) process.on(name, () => stop(code));
  const parent = process.ppid;
  const startedByNpm = process.env.npm_lifecycle_event !== undefined;
  if (startedByNpm) {
    setInterval(() => {
      if (process.ppid !== parent) stop(EXIT_CODES.SIGTERM);
    }, PARENT_POLL_MS).unref();
  }
  return { signal: controller.signal, exitCode: () => exitCode };
}
