import type { GestureResponderEvent } from 'react-native';

const STEPS: Readonly<Record<string, number>> = {
  ArrowDown: 1,
  ArrowRight: 1,
  ArrowUp: -1,
  ArrowLeft: -1,
};

/** The arrow keys move between the answers of a radio group and choose, as in a native one. */
export function moveFocus(event: GestureResponderEvent): void {
  const keyboard = event as unknown as KeyboardEvent & { currentTarget: HTMLElement };
  const step = STEPS[keyboard.key];
  if (step === undefined) return;
  const answers = Array.from(
    keyboard.currentTarget.querySelectorAll<HTMLElement>('[role="radio"]'),
  ).filter((answer) => answer.getAttribute('aria-disabled') !== 'true');
  const at = answers.findIndex((answer) => answer === document.activeElement);
  const next = answers[(at + step + answers.length) % answers.length];
  if (at < 0 || next === undefined) return;
  keyboard.preventDefault();
  next.focus();
  next.click();
}
