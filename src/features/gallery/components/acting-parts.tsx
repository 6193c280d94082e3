import { useState } from 'react';
import {
  Body,
  Button,
  Dialog,
  Disclosure,
  IconButton,
  Inline,
  LinkButton,
  Menu,
  StatusLine,
} from '../../../ui';
import { BothSchemes } from './both-schemes';

export function ActingParts() {
  return (
    <>
      <BothSchemes title="Buttons">
        {() => (
          <>
            <Inline>
              <Button label="Try a change" kind="primary" onPress={() => undefined} />
              <Button label="Find a better wall" onPress={() => undefined} />
              <Button label="Cancel" kind="quiet" onPress={() => undefined} />
            </Inline>
            <Inline>
              <Button label="Add a layer" icon="add" onPress={() => undefined} />
              <Button label="Save" busyLabel="Saving…" kind="primary" isBusy onPress={() => undefined} />
              <Button label="Not now" isDisabled onPress={() => undefined} />
              <LinkButton label="A link that looks so" href="/gallery" />
            </Inline>
            <Inline gap="x1">
              <IconButton icon="up" label="Move EVOH 5 outwards" onPress={() => undefined} />
              <IconButton icon="down" label="Move EVOH 5 inwards" onPress={() => undefined} isDisabled />
              <IconButton icon="duplicate" label="Duplicate EVOH 5" onPress={() => undefined} isPressed />
              <IconButton icon="remove" label="Remove EVOH 5" onPress={() => undefined} />
            </Inline>
          </>
        )}
      </BothSchemes>
      <BothSchemes title="Menu, dialog, disclosure">{() => <OpeningParts />}</BothSchemes>
    </>
  );
}

function OpeningParts() {
  const [isOpen, setIsOpen] = useState(false);
  const [message, setMessage] = useState('');
  return (
    <>
      <Inline>
        <Menu
          label="More about EVOH 5"
          items={[
            { label: 'Duplicate', icon: 'duplicate', onPress: () => setMessage('Duplicated EVOH 5.') },
            { label: 'Remove', icon: 'remove', onPress: () => setMessage('Removed EVOH 5.') },
          ]}
        />
        <Button label="Open a dialog" onPress={() => setIsOpen(true)} />
      </Inline>
      <StatusLine message={message} />
      <Dialog
        title="Leave without saving"
        isOpen={isOpen}
        onClose={() => setIsOpen(false)}
        actions={
          <>
            <Button label="Stay" kind="primary" onPress={() => setIsOpen(false)} />
            <Button label="Leave" onPress={() => setIsOpen(false)} />
          </>
        }
      >
        <Body>The draft stays on this device until you sign out.</Body>
      </Dialog>
      <Disclosure>
        <Body tone="second">What was hidden.</Body>
      </Disclosure>
      <Disclosure label="Open from the start" isOpenAtFirst>
        <Body tone="second">What is shown.</Body>
      </Disclosure>
    </>
  );
}
