/** On a phone app the list stays mounted under the record. */
export function keepListPlace(_key: string): void {}
export function useListPlace(_key: string, _ready: boolean): void {}
export function useTopOf(_record: string): void {}
