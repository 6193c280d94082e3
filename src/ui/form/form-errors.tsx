import { getIn, useFormikContext } from 'formik';
import { View } from 'react-native';
import { Notice } from '../notice';
import { Small } from '../text';
import { SPACE } from '../tokens';
import { faultsByName, type NamedFault } from './fault-list';
import { controlId, useFormContextValue } from './form-context';

/** Above the submit button once the form was sent in vain: every fault by name, each leading to its field. */
export function FormErrors() {
  const formik = useFormikContext<object>();
  const { formId, serverFaults, formFault } = useFormContextValue();
  if (formik.submitCount === 0 || formik.isSubmitting) return null;

  const own = faultsByName(formik.errors);
  const ownNames = new Set(own.map((entry) => entry.name));
  const standing = Object.entries(serverFaults)
    .filter(([name, fault]) => !ownNames.has(name) && Object.is(fault.valueSent, getIn(formik.values, name)))
    .map(([name, fault]) => ({ name, message: fault.message }));
  const entries = inPageOrder([...own, ...standing], formId);
  if (entries.length === 0 && formFault === null) return null;

  const title =
    entries.length === 0
      ? undefined
      : entries.length === 1
        ? 'One field needs a look'
        : `${entries.length} fields need a look`;
  return (
    <Notice kind="error" title={title} isLive>
      <View style={{ gap: SPACE.x1 }}>
        {formFault === null ? null : <Small tone="ink">{formFault}</Small>}
        {entries.map(({ name, message }) => (
          <a
            key={name}
            href={`#${controlId(formId, name)}`}
            style={{ color: 'inherit', display: 'block', padding: '4px 0' }}
            onClick={(event) => {
              event.preventDefault();
              document.getElementById(controlId(formId, name))?.focus();
            }}
          >
            <Small tone="ink">{message}</Small>
          </a>
        ))}
      </View>
    </Notice>
  );
}

/** As the fields stand on the page; a fault without a field of its own comes last. */
function inPageOrder(entries: NamedFault[], formId: string): NamedFault[] {
  const placed = entries.map((entry) => ({
    entry,
    control: document.getElementById(controlId(formId, entry.name)),
  }));
  placed.sort((a, b) => {
    if (a.control === null || b.control === null)
      return Number(a.control === null) - Number(b.control === null);
    return a.control.compareDocumentPosition(b.control) & Node.DOCUMENT_POSITION_FOLLOWING ? -1 : 1;
  });
  return placed.map(({ entry }) => entry);
}
