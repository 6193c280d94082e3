import { Slot } from 'expo-router';
import { AccountFrame } from '../../../src/features/shell/account-frame';

export default function AccountLayout() {
  return (
    <AccountFrame>
      <Slot />
    </AccountFrame>
  );
}
