// @ts-check
import path from 'node:path';

/** The folder that holds package.json of the whole house. */
export const root = path.resolve(import.meta.dirname, '../../..');
