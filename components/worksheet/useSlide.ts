import { useEffect, useRef, useState } from 'react';
import { AccessibilityInfo } from 'react-native';
import { farthestFeet, type ZoneSet } from '@/shared/drawing/zones';
import { motion } from '../theme/tokens';

/** Whether the person asked for less motion; true until the device has answered. */
export function useReducedMotion(): boolean {
  const [reduced, setReduced] = useState(true);
  useEffect(() => {
    let current = true;
    void AccessibilityInfo.isReduceMotionEnabled().then((isReduced) => {
      if (current) setReduced(isReduced);
    });
    const subscription = AccessibilityInfo.addEventListener('reduceMotionChanged', setReduced);
    return () => {
      current = false;
      subscription?.remove();
    };
  }, []);
  return reduced;
}

/** Ease-out, no overshoot. */
const easeOut = (part: number): number => 1 - (1 - part) ** 3;

/** The zones of `to`, each on its way from where it stood in `from`. */
function between(from: ZoneSet, to: ZoneSet, part: number): ZoneSet {
  const mix = (start: number, end: number) => start + (end - start) * part;
  const startOf = (role: string, end: number) =>
    from.zones.find((zone) => zone.role === role)?.feet ?? end;
  return {
    ...to,
    zones: to.zones.map((zone) => ({
      ...zone,
      feet: zone.feet === 0 ? 0 : mix(startOf(zone.role, zone.feet), zone.feet),
    })),
    barricade: to.barricade && {
      ...to.barricade,
      feet: mix(from.barricade?.feet ?? to.barricade.feet, to.barricade.feet),
    },
  };
}

/**
 * Boundaries that slide to a new place in 240 ms. Figures change at once: only
 * the picture moves, and a boundary that grew is drawn at least as far as it
 * was. With less motion asked for it stands at its new place at once.
 */
export function useSlide(target: ZoneSet): { zones: ZoneSet; sliding: boolean } {
  const reduced = useReducedMotion();
  const [shown, setShown] = useState(target);
  const from = useRef(target);
  const key = JSON.stringify(target);

  useEffect(() => {
    const start = from.current;
    from.current = target;
    // Nothing slides in from nowhere, and a message replaces the zones at once.
    const stands = farthestFeet(start) === 0 || farthestFeet(target) === 0;
    if (reduced || stands || JSON.stringify(start) === key) {
      setShown(target);
      return undefined;
    }
    const begun = performance.now();
    let frame = requestAnimationFrame(function step(now) {
      const part = Math.min(1, Math.max(0, (now - begun) / motion.slide));
      setShown(part < 1 ? between(start, target, easeOut(part)) : target);
      if (part < 1) frame = requestAnimationFrame(step);
    });
    return () => cancelAnimationFrame(frame);
    // `key` stands for the target: a new object with the same zones is no change.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [key, reduced]);

  const isCurrent = JSON.stringify(shown) === key;
  return { zones: isCurrent || !reduced ? shown : target, sliding: !isCurrent };
}
