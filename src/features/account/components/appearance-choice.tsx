import { Choice, useTheme } from '../../../ui';

const OPTIONS = [
  { value: 'light', label: 'Light' },
  { value: 'dark', label: 'Dark' },
  { value: 'device', label: 'As the device' },
];

export function AppearanceChoice() {
  const { preference, setPreference } = useTheme();
  return (
    <Choice
      label="Appearance"
      hint="Kept on this device."
      value={preference}
      options={OPTIONS}
      onChange={(value) => setPreference(value === 'light' || value === 'dark' ? value : 'device')}
    />
  );
}
