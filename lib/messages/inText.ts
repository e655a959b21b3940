/** A name as it stands inside a line of text: 'Composite I-girders' -> 'composite I-girders'. */
export const inText = (name: string): string => name.charAt(0).toLowerCase() + name.slice(1);
