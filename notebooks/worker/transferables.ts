/** The buffers of all typed arrays inside plain data, each once: what can move to the other side without a copy. */
export function transferables(value: unknown): ArrayBuffer[] {
  const buffers = new Set<ArrayBuffer>();
  const seen = new Set<object>();
  const look = (part: unknown): void => {
    if (typeof part !== 'object' || part === null || seen.has(part)) return;
    seen.add(part);
    if (part instanceof ArrayBuffer) buffers.add(part);
    else if (ArrayBuffer.isView(part)) look(part.buffer);
    else if (part instanceof Map) for (const entry of part) entry.forEach(look);
    else for (const inner of part instanceof Set ? part : Object.values(part)) look(inner);
  };
  look(value);
  return [...buffers];
}
