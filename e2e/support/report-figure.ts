/** Prints a measured figure beside its goal. */
export function reportFigure(what: string, figure: number, goal: string): void {
  process.stdout.write(`${what}: ${figure.toFixed(2)} (goal: ${goal})\n`);
}
