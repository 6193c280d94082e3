import { LinkButton, Screen, Body, Inline } from '../../ui';

/** The same words for what is not there and for what is not yours. */
export function NotFoundScreen({ homeHref = '/' }: { homeHref?: string }) {
  return (
    <Screen title="Nothing at this address">
      <Body tone="second">
        It may have been moved, or it belongs to an account or a role that you are not signed in with. Check
        the address, or go on from your first screen.
      </Body>
      <Inline>
        <LinkButton href={homeHref} label="To my first screen" kind="primary" />
      </Inline>
    </Screen>
  );
}
