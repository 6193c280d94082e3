import { Slot } from 'expo-router';
import { PlaceGate } from '../../../../src/features/shell/place-gate';

export default function ClientLayout() {
  return (
    <PlaceGate roles={['client']}>
      <Slot />
    </PlaceGate>
  );
}
