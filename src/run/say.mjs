/** A failure whose message is all a person needs: it is printed without a stack. */
export class RunError extends Error {}

/** One line about what is being done. @param {string} line */
export const say = (line) => process.stdout.write(`${line}\n`);

/**
 * Runs a command's main function and turns a failure into a message and an exit code.
 * @param {() => Promise<number | void>} main
 */
export async function runMain(main) {
  try {
    process.exitCode = (await main()) ?? process.exitCode ?? 0;
  } catch (error) {
    process.stderr.write(`\n${explain(error)}\n`);
    process.exitCode = 1;
  }
}

/** @param {any} error */
function explain(error) {
  if (error instanceof RunError) return error.message;
  if (error?.code === 'EACCES') {
    return `${error.message}\nRun this as the owner of that path, or remove .ellwise to begin afresh.`;
  }
  return error?.stack ?? String(error);
}
