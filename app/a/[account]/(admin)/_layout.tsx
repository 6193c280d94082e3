import { Slot } from 'expo-router';
import { PlaceGate } from '../../../../src/features/shell/place-gate';

export default function AdminLayout() {
  return (
    <PlaceGate roles={['admin']}>
      <Slot />
    </PlaceGate>
  );
}
