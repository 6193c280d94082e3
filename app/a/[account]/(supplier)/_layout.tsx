import { Slot } from 'expo-router';
import { PlaceGate } from '../../../../src/features/shell/place-gate';

export default function SupplierLayout() {
  return (
    <PlaceGate roles={['supplier']}>
      <Slot />
    </PlaceGate>
  );
}
