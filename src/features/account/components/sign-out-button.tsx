import { useMutation } from '@tanstack/react-query';
import { View } from 'react-native';
import { describeError } from '../../../api/describe-error';
import { useSessionActions } from '../../../session';
import { Button, Notice, SPACE } from '../../../ui';

export function SignOutButton() {
  const { signOut } = useSessionActions();
  const leave = useMutation({ mutationFn: signOut });
  return (
    <View style={{ gap: SPACE.x2, alignItems: 'flex-end' }}>
      <Button
        label="Sign out"
        busyLabel="Signing out…"
        isBusy={leave.isPending}
        onPress={() => leave.mutate()}
      />
      {leave.isError ? (
        <Notice kind="error" isLive>
          {describeError(leave.error, 'You are still signed in').message}
        </Notice>
      ) : null}
    </View>
  );
}
