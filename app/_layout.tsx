import { Slot } from 'expo-router';
import { AppFrame } from '../src/features/shell/app-frame';

export default function RootLayout() {
  return (
    <AppFrame>
      <Slot />
    </AppFrame>
  );
}
