import {
  Button,
  ConflictNotice,
  EmptyState,
  FailedState,
  LoadingState,
  Notice,
  StatusLine,
} from '../../../ui';
import { BothSchemes } from './both-schemes';

export function TellingParts() {
  return (
    <>
      <BothSchemes title="Notices">
        {() => (
          <>
            <Notice>An estimate, not a proof: confirm by storage tests before a date goes on a pack.</Notice>
            <Notice kind="caution" title="Two coefficients come from memory">
              The answer leans on them; measure EVOH before you rely on it.
            </Notice>
            <Notice kind="error" title="The wall was not saved">
              Gauge of layer 2: 0 µm does not fit; use more than 0 and at most 2000 µm.
            </Notice>
            <ConflictNotice what="This wall" onKeepMine={() => undefined} onTakeTheirs={() => undefined} />
            <StatusLine message="Saved as revision 4." />
          </>
        )}
      </BothSchemes>
      <BothSchemes title="Empty, loading, failed">
        {() => (
          <>
            <EmptyState
              title="No study so far"
              action={<Button label="New study" kind="primary" onPress={() => undefined} />}
            >
              A study puts one food, one pack and one route before a wall and says how many days it keeps.
            </EmptyState>
            <LoadingState what="Fetching the study" heldPhase="brief" />
            <LoadingState what="Fetching the study" heldPhase="slow" />
            <FailedState
              title="The study could not be fetched"
              message="The database does not answer. Try again in a moment."
              reference="0193a1f2-77aa-7c1e-9d2e-4f6f0a9b1c3d"
              onRetry={() => undefined}
            />
            <FailedState
              title="No connection to the server"
              message="What you entered is still here; check the connection and try again."
              onRetry={() => undefined}
              isRetrying
            />
          </>
        )}
      </BothSchemes>
    </>
  );
}
