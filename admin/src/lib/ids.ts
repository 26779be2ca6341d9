import { v7 } from 'uuid';

/** UUIDv7: made where a thing is keyed, so that sending it twice changes nothing; sorts by time. */
export const newId = (): string => v7();
