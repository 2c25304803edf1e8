/** Sentences for the person at the terminal. */
export function say(sentence) {
  process.stdout.write(`${sentence}\n`);
}

/** A fault that a person can do something about: told in one sentence, without a stack. */
export class Fault extends Error {}

/** Runs the program; a Fault ends it with its sentence, anything else with its stack. */
export function run(program) {
  program().catch((error) => {
    process.stderr.write(`${error instanceof Fault ? error.message : (error.stack ?? error)}\n`);
    process.exit(1);
  });
}
