import { Slot } from 'expo-router';
import { PlaceGate } from '../../../../src/features/shell/place-gate';

export default function FoodsLayout() {
  return (
    <PlaceGate roles={['engineer', 'admin']}>
      <Slot />
    </PlaceGate>
  );
}
