import type { CSSProperties, ReactNode } from 'react';
import { space } from '../theme/tokens';

const style: CSSProperties = { display: 'flex', flexDirection: 'column', gap: space.md, margin: 0 };

interface Props {
  /** Only where no heading names the form. */
  label?: string;
  children: ReactNode;
}

/** A form for password managers and screen readers. Enter is the fields' own; the page is never sent. */
export function Form({ label, children }: Props) {
  return (
    <form aria-label={label} noValidate style={style} onSubmit={(event) => event.preventDefault()}>
      {children}
    </form>
  );
}
