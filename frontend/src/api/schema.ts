import type { components } from './generated/schema';

/** A shape of the API by its name in the server's description. */
export type Schema<Name extends keyof components['schemas']> = components['schemas'][Name];
