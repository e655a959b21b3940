/** Fields whose text, caret or open list would be lost if another element took their place. */
const edited = 'input, textarea, select, [contenteditable]';

/** Children on the way from `root` down to `element`, the first one a child of `root`. */
function wayTo(root: Element, element: Element): Element[] {
  const way: Element[] = [];
  for (let at: Element | null = element; at !== null && at !== root; at = at.parentElement) way.unshift(at);
  return way;
}

/** The part of a drawing that is kept as one: the field with its key, or the element itself. */
const keptPart = (root: Element, element: Element): Element => {
  const keyed = element.closest('[data-key]');
  return keyed !== null && keyed !== root && root.contains(keyed) ? keyed : element;
};

/** The element of the new drawing that stands for one of the old: of the same key or id, else in the same place. */
function twinOf(root: Element, next: Element, element: Element): Element | null {
  const key = element.getAttribute('data-key');
  if (key !== null) return next.querySelector(`[data-key="${CSS.escape(key)}"]`);
  if (element.id !== '') return next.querySelector(`#${CSS.escape(element.id)}`);
  let at: Element | null = next;
  for (const part of wayTo(root, element)) {
    const place: number = Array.from(part.parentElement!.children).indexOf(part);
    at = at.children[place] ?? null;
    if (at?.tagName !== part.tagName) return null;
  }
  return at;
}

function takeAttributes(element: Element, from: Element): void {
  for (const name of element.getAttributeNames()) {
    if (!from.hasAttribute(name)) element.removeAttribute(name);
  }
  for (const { name, value } of Array.from(from.attributes)) element.setAttribute(name, value);
}

/** Exchanges everything but `kept`, whose place in the new drawing is `twin`; false when the two places differ. */
function exchangeAround(root: Element, next: Element, kept: Element, twin: Element): boolean {
  const olds = wayTo(root, kept);
  const news = wayTo(next, twin);
  if (olds.length !== news.length || olds.some((old, i) => old.tagName !== news[i]?.tagName)) return false;
  olds.forEach((old, i) => {
    const fresh = news[i]!;
    const parent = old.parentElement!;
    const others = Array.from(fresh.parentElement!.childNodes);
    const place = others.indexOf(fresh);
    for (const node of Array.from(parent.childNodes)) if (node !== old) node.remove();
    old.before(...others.slice(0, place));
    old.after(...others.slice(place + 1));
    if (old !== kept) takeAttributes(old, fresh);
  });
  return true;
}

/**
 * Puts the children of `next` in the place of those of `root`. The focus stays where it was: a field that is being
 * edited stays itself, text and caret included, with everything round it exchanged; anything else that holds the focus
 * hands it to its counterpart. Lists pushed sideways stay where they were.
 * @returns false when something old had to stay: exchange again once the focus has gone
 */
export function exchange(root: Element, next: Element): boolean {
  const active = root.ownerDocument.activeElement;
  if (active !== null && active !== root && root.contains(active)) {
    const kept = keptPart(root, active);
    const twin = twinOf(root, next, kept);
    if (active.matches(edited)) {
      if (twin !== null) exchangeAround(root, next, kept, twin);
      return false;
    }
    replace(root, next);
    if (twin instanceof HTMLElement || twin instanceof SVGElement) twin.focus({ preventScroll: true });
    return true;
  }
  replace(root, next);
  return true;
}

function replace(root: Element, next: Element): void {
  const lists = root.querySelectorAll<HTMLElement>('.pushed');
  const pushed = Array.from(lists, ({ dataset }) => Number(dataset['left'] ?? 0));
  root.replaceChildren(...Array.from(next.childNodes));
  if (!pushed.some((left) => left > 0)) return;
  root.querySelectorAll('.pushed').forEach((list, i) => {
    list.scrollLeft = pushed[i] ?? 0;
  });
}
