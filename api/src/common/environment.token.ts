/** Injects the checked environment (`config/environment.ts`) without importing its room. */
export const ENVIRONMENT = Symbol('environment');
