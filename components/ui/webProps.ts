/**
 * Attributes that React Native's types lack but the web target passes on
 * (`aria-describedby`, `aria-invalid`, `tabIndex`, `lang` …). The one place for that cast.
 */
export function webProps(props: Readonly<Record<string, unknown>>): object {
  return props;
}
