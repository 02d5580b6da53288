/** What one request may carry, so that a weak signal gets it through before it breaks. */
export const BATCH_EVENTS = 50;
export const BATCH_BYTES = 256 * 1024;
