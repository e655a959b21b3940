/** Path of a Chromium, found or installed; rejects with the remedy when there is none. */
export function findChromium(): Promise<string>;
