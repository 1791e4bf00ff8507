const FOCUSABLE =
  'input:not([disabled]),textarea:not([disabled]),button:not([disabled]),a[href],[tabindex="0"]';

function lessMotion(): boolean {
  return window.matchMedia?.('(prefers-reduced-motion: reduce)').matches ?? false;
}

/**
 * Brings a field, a panel or a section into view and gives it the focus.
 * Answers false where nothing has that id: it may stand in a folded section.
 */
export function focusField(id: string): boolean {
  const found = document.getElementById(id);
  if (found === null) return false;
  const label = document.getElementById(`${id}-label`);
  (label ?? found).scrollIntoView({ block: 'center', behavior: lessMotion() ? 'auto' : 'smooth' });
  const inside = found.matches(FOCUSABLE) ? found : found.querySelector<HTMLElement>(FOCUSABLE);
  (inside ?? found).focus({ preventScroll: true });
  return true;
}
