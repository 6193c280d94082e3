export * from './tokens';
export { ThemeProvider, ThemeScope, useTheme, type Theme, type SchemePreference } from './theme';
export { useIsWide, useIsAtLeast } from './use-is-wide';
export { NavigationProvider, useAnchorClick, type Navigation } from './navigation';

// Layout
export { Screen, type ScreenProps } from './screen';
export { PageTitleProvider, usePageTitle } from './page-title';
export { Stack, Inline, type StackProps, type InlineProps, type Gap } from './stack';
export { Sheet, type SheetProps } from './sheet';
export { TitleBlock, type TitleBlockProps, type TitleBlockCell } from './title-block';
export { Strip, type StripProps, type StripCell } from './strip';
export { Row, type RowProps } from './row';
export { Divider } from './divider';

// Words and figures
export {
  Title,
  Heading,
  Body,
  Small,
  Label,
  textStyle,
  toneColor,
  type TextPartProps,
  type Tone,
} from './text';
export { Figure, type FigureProps } from './figure';
export { Link, type LinkProps } from './link';
export { Icon, ICON_NAMES, type IconName } from './icon';

// Acting
export { Button, LinkButton, type ButtonProps, type LinkButtonProps, type ButtonKind } from './button';
export { IconButton, type IconButtonProps } from './icon-button';
export { Menu, type MenuProps, type MenuItem } from './menu';
export { Dialog, type DialogProps } from './dialog';
export { Disclosure, type DisclosureProps } from './disclosure';

// Entering
export { Field, fieldDescription, type FieldProps } from './field';
export { TextField, type TextFieldProps, type TextInputOptions } from './text-field';
export { NumberField, type NumberFieldProps, type NumberInputOptions } from './number-field';
export { Stepper, type StepperProps } from './stepper';
export { parseTypedNumber, stepTypedNumber } from './typed-number';
export { Select, type SelectProps, type SelectOption, type SelectGroup } from './select';
export { Choice, type ChoiceProps, type ChoiceOption } from './choice';
export { Checkbox, type CheckboxProps } from './checkbox';

// Telling
export { DataTable, type DataTableProps, type DataColumn, type DataRow } from './data-table';
export { Notice, type NoticeProps, type NoticeKind } from './notice';
export { ConflictNotice, type ConflictNoticeProps } from './conflict-notice';
export { EmptyState, type EmptyStateProps } from './empty-state';
export { LoadingState, type LoadingStateProps } from './loading-state';
export { FailedState, type FailedStateProps } from './failed-state';
export { StatusLine, type StatusLineProps } from './status-line';

// Formik binding
export { Form, type FormProps } from './form/form';
export { FormField, type FormFieldProps } from './form/form-field';
export { FormNumberField, type FormNumberFieldProps } from './form/form-number-field';
export { FormSelect, type FormSelectProps } from './form/form-select';
export { FormChoice, type FormChoiceProps } from './form/form-choice';
export { FormCheckbox, type FormCheckboxProps } from './form/form-checkbox';
export { FormErrors } from './form/form-errors';
export { FormSubmit, type FormSubmitProps } from './form/form-submit';
export { useFieldBinding, type FieldBinding } from './form/use-field-binding';
export { validateWith } from './form/validate-with';
