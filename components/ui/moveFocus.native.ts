import type { GestureResponderEvent } from 'react-native';

/** Phones have no arrow keys; the screen reader moves by itself. */
export function moveFocus(_event: GestureResponderEvent): void {}
