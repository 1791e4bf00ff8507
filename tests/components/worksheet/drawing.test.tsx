import { render, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { DistanceStrip } from '@/components/worksheet/DistanceStrip';
import { DrawingView } from '@/components/worksheet/DrawingView';
import { SectionDrawing } from '@/components/worksheet/SectionDrawing';
import { assess } from '@/hazard';
import { sectionGeometry } from '@/shared/drawing/section';
import { stripGeometry } from '@/shared/drawing/strip';
import { sectionInputOf, zonesOfWorksheet } from '@/shared/drawing/worksheetDrawing';
import { messages } from '@/shared/messages';
import { soundWorksheet } from '../../support/soundWorksheet';

const { content, on } = soundWorksheet();
const assessment = assess(content, { on });
const subject = {
  content,
  assessment,
  messages: messages('en-US'),
  locale: 'en-US',
  units: 'feet',
} as const;
/** Figures have no-break spaces; what is read aloud is compared with ordinary ones. */
const plain = (words: string | null) => (words ?? '').replaceAll('\u00a0', ' ');

afterEach(() => vi.restoreAllMocks());

describe('DistanceStrip', () => {
  it('is one button that says every distance in words', async () => {
    const onPress = vi.fn();
    render(
      <DistanceStrip content={content} assessment={assessment} open={false} onPress={onPress} />,
    );
    const strip = screen.getByRole('button');
    const name = plain(strip.getAttribute('aria-label'));
    expect(name).toContain('Distance strip. Opens the drawing. 120 V phase-to-phase.');
    expect(name).toContain('Restricted approach boundary: Avoid contact.');
    expect(name).toContain('Limited approach boundary, fixed: 3 ft 6 in (1.0 m).');
    expect(name).toContain('Arc flash boundary: 1 ft 7 in (0.485 m).');
    expect(name).toContain('Barricade, at least: 3 ft 6 in (1.0 m).');
    expect(strip.getAttribute('aria-expanded')).toBe('false');
    await userEvent.click(strip);
    expect(onPress).toHaveBeenCalledOnce();
  });

  it('says that the distances are not known while the voltage is not', () => {
    const nothing = assess({}, { on });
    render(<DistanceStrip content={{}} assessment={nothing} open onPress={() => undefined} />);
    const name = plain(screen.getByRole('button').getAttribute('aria-label'));
    expect(name).toContain('Folds the drawing');
    expect(name).toContain('Distances: not known until section 2 is complete.');
    expect(name).not.toMatch(/\d ft/);
  });

  it('shows the new distances after the supply changed', async () => {
    const { rerender } = render(
      <DistanceStrip
        content={content}
        assessment={assessment}
        open={false}
        onPress={() => undefined}
      />,
    );
    const supply = { ...content.supply, system: '480Y/277' as const, circuitVolts: 277 };
    const changed = { ...content, supply };
    rerender(
      <DistanceStrip
        content={changed}
        assessment={assess(changed, { on })}
        open={false}
        onPress={() => undefined}
      />,
    );
    await waitFor(() => {
      const name = plain(screen.getByRole('button').getAttribute('aria-label'));
      expect(name).toContain('480 V phase-to-phase, from 277 V.');
      expect(name).toContain('Restricted approach boundary: 1 ft 0 in (0.3 m).');
    });
  });
});

describe('SectionDrawing', () => {
  it('is a picture with the distances in words', () => {
    render(<SectionDrawing content={content} assessment={assessment} />);
    const name = plain(screen.getByRole('img').getAttribute('aria-label'));
    expect(name).toContain('Section, to scale. Restricted approach boundary: Avoid contact.');
  });
});

describe('DrawingView', () => {
  it('draws every text of the strip, with an outline below where it asks for one', () => {
    const drawing = stripGeometry({ zones: zonesOfWorksheet(subject), units: 'feet', width: 358 });
    const { container } = render(<DrawingView drawing={drawing} />);
    const texts = Array.from(container.querySelectorAll('text')).map((text) =>
      plain(text.textContent),
    );
    expect(texts).toEqual(
      expect.arrayContaining(['Avoid contact', '3 ft 6 in', 'Barricade', 'ft']),
    );
    expect(container.querySelectorAll('pattern')).toHaveLength(0);
  });

  it('draws the section with lines only: no pattern and no clip', () => {
    const drawing = sectionGeometry(
      sectionInputOf(subject, { width: 358, pixelsPerFoot: 33, medium: 'screen' }),
    );
    const { container } = render(<DrawingView drawing={drawing} />);
    expect(container.querySelectorAll('pattern, clipPath')).toHaveLength(0);
    const lead = Array.from(container.querySelectorAll('text')).filter(
      ({ textContent }) => textContent === 'Lead',
    );
    expect(lead).toHaveLength(2);
  });
});
