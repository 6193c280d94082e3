// A reader that went away (a closed terminal, `npm start | head`) must not end a script before it has stopped what it
// started: without these listeners the next line written would throw.
for (const stream of [process.stdout, process.stderr]) stream.on('error', () => undefined);

/** One calm line on standard output. @param {string} line */
export function say(line) {
  process.stdout.write(`${line}\n`);
}

/** A failure whose message already tells the remedy: printed without a stack. */
export class Remedy extends Error {}

/**
 * Runs a script's main function; a failure is printed and ends the process with code 1.
 * @param {() => Promise<void>} main
 */
export async function runScript(main) {
  try {
    await main();
  } catch (error) {
    const text =
      error instanceof Remedy ? error.message : error instanceof Error ? error.stack : String(error);
    process.stderr.write(`\n${text}\n`);
    process.exitCode = 1;
  }
}
