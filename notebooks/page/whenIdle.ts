/** Runs a job once the page has nothing else to do. */
export function whenIdle(job: () => void): void {
  // Not every browser tells.
  if ('requestIdleCallback' in window) window.requestIdleCallback(() => job());
  else setTimeout(job, 300);
}
