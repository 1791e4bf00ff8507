/** On a phone app the navigator moves the focus. */
export function usePageChange(): void {}
