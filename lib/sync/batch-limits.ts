/** What one request may carry, so that a weak signal gets it through before it breaks. */
export const BATCH_EVENTS = 50;
export const BATCH_BYTES = 256 * 1024;
/** The photographs of an exported file together [bytes]: some hundred, and still a file that a phone can write and share. */
export const PHONE_FILE_PHOTOGRAPH_BYTES = 32 * 1024 * 1024;
