import { describeError } from '../../api/describe-error';
import { FailedState, Screen } from '../../ui';

export interface UnreachableScreenProps {
  error: unknown;
  onRetry: () => void;
}

export function UnreachableScreen({ error, onRetry }: UnreachableScreenProps) {
  const words = describeError(error, 'Your session could not be read');
  return (
    <Screen title="Larderline does not answer" width="narrow">
      <FailedState
        title={words.title}
        message={words.message}
        reference={words.reference}
        onRetry={onRetry}
      />
    </Screen>
  );
}
