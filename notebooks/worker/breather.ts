/**
 * A pause that lets waiting messages through. A channel of its own rather than a timer, because timers started from
 * timers are held back to 4 ms, half a slice.
 */
export function breather(): () => Promise<void> {
  const { port1, port2 } = new MessageChannel();
  const waiting: (() => void)[] = [];
  port1.onmessage = () => waiting.shift()?.();
  return () =>
    new Promise((resolve) => {
      waiting.push(resolve);
      port2.postMessage(null);
    });
}
