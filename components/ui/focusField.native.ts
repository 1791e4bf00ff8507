/** On a phone app the screen reader follows the order of the page; nothing is focused by id. */
export function focusField(_id: string): boolean {
  return false;
}
