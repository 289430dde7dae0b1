/** Prints one line of progress. */
export function say(line) {
  process.stdout.write(`${line}\n`);
}

/** Ends the program with a message that says what is wrong and what to do about it. */
export function giveUp(what, remedy) {
  process.stderr.write(`\nLampwright: ${what}\n${remedy}\n`);
  process.exit(1);
}
