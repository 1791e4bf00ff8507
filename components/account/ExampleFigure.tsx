import { View } from 'react-native';

export function ExampleFigure() {
  return <View />;
}
