import { Slot } from 'expo-router';
import { PlainPage } from '../../src/features/shell/plain-page';

export default function OutsideLayout() {
  return (
    <PlainPage>
      <Slot />
    </PlainPage>
  );
}
