/** A reason to stop that a person can mend: printed as its one sentence, without a stack. */
export class Refusal extends Error {}

/** Runs a launcher; a refusal ends it with its sentence, anything else is a fault of ours and keeps its stack. */
export async function runLauncher(launch) {
  try {
    await launch();
  } catch (error) {
    process.stderr.write(error instanceof Refusal ? `${error.message}\n` : `${error.stack}\n`);
    process.exitCode = 1;
  }
}
