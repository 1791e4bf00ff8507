import { Fragment } from 'react';
import type { Citation as CitationData } from '@/hazard/types';
import { citationPlace, citationWords } from '@/shared/messages';
import { useLocale } from '../i18n/preferences';
import { Text } from './Text';

/** 0.13 em between `)` and `(`: Barlow's parentheses touch where they meet. */
function spaced(text: string) {
  const parts = text.split(/\)(?=\()/);
  return parts.map((part, index) => (
    <Fragment key={index}>
      {part}
      {index < parts.length - 1 && (
        <Text variant="cite" color="ink2" style={{ letterSpacing: 14 * 0.13 }}>
          {')'}
        </Text>
      )}
    </Fragment>
  ));
}

interface Props {
  /** Several that rest on the same words are shown once. */
  citation: CitationData | readonly CitationData[];
  /** Whether how far the figure was checked is said after it. */
  confidence?: boolean;
  /** A sentence before it. */
  lead?: string;
}

/** Where a figure or a rule comes from, and in words how it was checked. */
export function Citation({ citation, confidence = true, lead }: Props) {
  const locale = useLocale();
  const all = 'standard' in citation ? [citation] : citation;
  const words = confidence ? citationWords : citationPlace;
  const lines = all.map((each) => words(locale, each));
  const text = [...new Set(lines)].join('. ');
  return (
    <Text variant="cite" color="ink2">
      {lead !== undefined && `${lead} `}
      {spaced(text)}
    </Text>
  );
}
