import { NotFoundScreen } from './not-found-screen';
import { PlainPage } from './plain-page';

export function NotFoundPage() {
  return (
    <PlainPage>
      <NotFoundScreen />
    </PlainPage>
  );
}
