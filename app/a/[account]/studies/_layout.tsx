import { Slot } from 'expo-router';
import { PlaceGate } from '../../../../src/features/shell/place-gate';

export default function StudiesLayout() {
  return (
    <PlaceGate roles={['engineer', 'admin']}>
      <Slot />
    </PlaceGate>
  );
}
