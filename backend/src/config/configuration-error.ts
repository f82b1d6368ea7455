/** Thrown at start when the environment cannot be understood; its message names every faulty variable. */
export class ConfigurationError extends Error {
  override readonly name = 'ConfigurationError';

  constructor(readonly faults: readonly string[]) {
    super(`The configuration cannot be used:\n${faults.map((fault) => `  - ${fault}`).join('\n')}`);
  }
}
