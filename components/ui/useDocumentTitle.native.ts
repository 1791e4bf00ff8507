/** A phone app has no tab to name. */
export function useDocumentTitle(_title: string): void {}
