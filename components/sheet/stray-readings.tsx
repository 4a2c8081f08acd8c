'use client';

import { useEffect, useRef, useState } from 'react';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { KeyBurst } from './key-burst';

const isTyping = (target: EventTarget | null) =>
  target instanceof HTMLElement && (target.isContentEditable || /^(INPUT|TEXTAREA|SELECT)$/.test(target.tagName));
const belongsToFigure = /^[\d.,+\-−]$/;
/** An instrument without a terminator is quiet after its reading. */
const settleMs = 150;

/**
 * Readings that an instrument sends while no field has the focus: kept in sight until somebody says where they belong, and their Enter
 * presses no button.
 */
export function StrayReadings({ onPlace }: { onPlace: (text: string) => boolean }) {
  const [strays, setStrays] = useState<string[]>([]);
  const state = useRef({ text: '', burst: new KeyBurst() });
  useEffect(() => {
    let settle: ReturnType<typeof setTimeout> | undefined;
    const take = (): boolean => {
      const { text, burst } = state.current;
      const fromDevice = burst.isDevice();
      state.current = { text: '', burst: new KeyBurst() };
      clearTimeout(settle);
      if (fromDevice && text !== '') setStrays((before) => [...before, text]);
      return fromDevice;
    };
    const listen = (event: KeyboardEvent) => {
      if (isTyping(event.target) || event.ctrlKey || event.metaKey || event.altKey) return;
      if (belongsToFigure.test(event.key)) {
        state.current.burst.key(event.timeStamp, event.repeat);
        state.current.text += event.key;
        clearTimeout(settle);
        settle = setTimeout(take, settleMs);
      } else if ((event.key === 'Enter' || event.key === 'Tab') && state.current.text !== '' && take()) {
        event.preventDefault();
        event.stopPropagation();
      }
    };
    document.addEventListener('keydown', listen, true);
    return () => {
      clearTimeout(settle);
      document.removeEventListener('keydown', listen, true);
    };
  }, []);
  if (strays.length === 0) return null;
  const place = () => {
    const [first, ...rest] = strays;
    if (first !== undefined && onPlace(first)) setStrays(rest);
  };
  return (
    <Notice tone="brass" title="Readings without a field" live>
      <p>
        The instrument sent <span className="font-mono font-medium">{strays.join(' · ')}</span> while no field was
        chosen.
      </p>
      <div className="mt-1 flex flex-wrap gap-2">
        <Button onClick={place}>Put {strays[0]} into the next empty field</Button>
        <Button onClick={() => setStrays(strays.slice(1))}>Drop {strays[0]}</Button>
      </div>
    </Notice>
  );
}
