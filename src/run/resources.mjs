/**
 * What a command has opened: closed last first when it ends or is told to end, once.
 * @param {{ interruptedCode?: number }} [options] the exit code when told to end
 */
export function openResources({ interruptedCode = 130 } = {}) {
  /** @type {(() => unknown)[]} */
  const closers = [];
  /** @type {Promise<void> | undefined} */
  let closing;

  const closeAll = async () => {
    for (let close = closers.pop(); close; close = closers.pop()) await close();
  };
  const resources = {
    /** @param {() => unknown} close */
    add: (close) => closers.push(close),
    close: () => (closing ??= closeAll()),
    isClosing: () => closing !== undefined,
  };
  for (const name of ['SIGINT', 'SIGTERM', 'SIGHUP']) {
    process.on(name, async () => {
      await resources.close();
      process.exit(interruptedCode);
    });
  }
  return resources;
}

/** @typedef {ReturnType<typeof openResources>} Resources */
