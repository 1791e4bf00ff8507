/** A native screen that shows something else is drawn anew, at its top. */
export function useToTop(_shown: string): void {}
