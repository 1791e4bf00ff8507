/** Opens a file of the server in a tab of its own. */
export function openUrl(url: string): void {
  window.open(url, '_blank', 'noopener');
}
