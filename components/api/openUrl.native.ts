import { Linking } from 'react-native';

/** Opens a file of the server in the device's own viewer. */
export function openUrl(url: string): void {
  void Linking.openURL(url);
}
