/**
 * Brings what the Tab key has come to wholly on the screen: the browser leaves what is cut off at the edge of a table or
 * drawing pushed sideways where it is. Nothing moves for a pointer.
 * @returns ends it
 */
export function bringTabbedToSight(): () => void {
  const bring = ({ key }: KeyboardEvent): void => {
    if (key === 'Tab') document.activeElement?.scrollIntoView({ block: 'nearest', inline: 'nearest' });
  };
  addEventListener('keyup', bring);
  return () => removeEventListener('keyup', bring);
}
