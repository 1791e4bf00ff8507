export { Button, type ButtonKind, type ButtonProps } from './Button';
export { CautionFoot } from './CautionFoot';
export { CheckRow, Toggle, type CheckRowProps } from './CheckRow';
export {
  Choice,
  MultiChoice,
  type ChoiceLayout,
  type ChoiceProps,
  type MultiChoiceProps,
  type Option,
} from './Choice';
export { Citation } from './Citation';
export {
  DateField,
  DateTimeField,
  type DateFieldProps,
  type DateTimeFieldProps,
} from './DateTimeField';
export { ErrorSummary, type FieldFault } from './ErrorSummary';
export { Facts, type Fact } from './Facts';
export { describeFault, referenceOf } from './faults';
export { Field, fieldAria, type FieldProps } from './Field';
export { focusField } from './focusField';
export { Form } from './Form';
export { Header, type BackLink } from './Header';
export { Icon, Mark } from './Icon';
export { iconPaths, markLine, type IconName } from './icons';
export { ListRow, type ListRowProps } from './ListRow';
export { Notice } from './Notice';
export { NumberField, type NumberFieldProps } from './NumberField';
export { CautionPanel, FirstAidPanel, StopPanel, type FirstAidRow } from './panels';
export { parseNumber, type ParsedNumber } from './parseNumber';
export { PinField, type PinFieldProps } from './PinField';
export { PlacesList } from './PlacesList';
export { SavedState } from './SavedState';
export { Screen, type ScreenProps } from './Screen';
export { LoadingScreen, NotFoundScreen, OfflineScreen, ProblemScreen } from './screens';
export { Section, type SectionProps } from './Section';
export { Select, type SelectProps } from './Select';
export { ShellContext, useShell, type Place, type Shell } from './shell';
export { SignaturePad } from './SignaturePad';
export type { SignaturePadProps, StrokeList } from './SignaturePadProps';
export { MARK_STATES, StateMark, StateSymbol, type MarkState } from './StateMark';
export { Table, type Column, type TableProps } from './Table';
export { Text, textStyle, type UiTextProps } from './Text';
export { TextField, type TextFieldProps } from './TextField';
export { TitleBlock, type TitleCell } from './TitleBlock';
export { useDocumentTitle } from './useDocumentTitle';
export { VerdictBar, type VerdictBarProps } from './VerdictBar';
export { webProps } from './webProps';
export { YesNo, type YesNoProps } from './YesNo';
