'use client';

import { type PointerEvent, useRef, useState } from 'react';
import { Button } from '@/components/ui/button';
import { strokeBox } from './signature-mark';

/** The pad shows the middle of the box, so that it is high enough on a telephone, too. */
const shownWidth = 500;
/** Closer points say nothing more, and keep the stored path small. */
const leastStep = 1.5;
const longestStroke = 19_000;

interface Line {
  d: string;
  x: number;
  y: number;
}

/** Where a signature is drawn with finger, pen or mouse. Strokes are SVG path data in a box of 600 × 200. */
export function SignaturePad(props: { strokes: string[]; onChange: (strokes: string[]) => void }) {
  const { strokes, onChange } = props;
  const field = useRef<SVGSVGElement>(null);
  const [line, setLine] = useState<Line | null>(null);

  const at = (event: { clientX: number; clientY: number }) => {
    const matrix = field.current?.getScreenCTM();
    if (!matrix) return null;
    const { x, y } = new DOMPoint(event.clientX, event.clientY).matrixTransform(matrix.inverse());
    const within = (value: number, most: number) => Math.round(Math.min(Math.max(value, 0), most) * 10) / 10;
    return { x: within(x, strokeBox.width), y: within(y, strokeBox.height) };
  };
  const begin = (event: PointerEvent<SVGSVGElement>) => {
    if (!event.isPrimary || event.button !== 0) return;
    const point = at(event);
    if (!point) return;
    event.preventDefault();
    event.currentTarget.setPointerCapture(event.pointerId);
    // A tap is a dot: a line that goes nowhere is drawn by its round ends.
    setLine({ d: `M${point.x} ${point.y}L${point.x} ${point.y}`, ...point });
  };
  const go = (event: PointerEvent<SVGSVGElement>) => {
    if (!line || !event.isPrimary) return;
    const events = event.nativeEvent.getCoalescedEvents?.() ?? [];
    setLine(
      (events.length > 0 ? events : [event.nativeEvent]).reduce((drawn: Line, each) => {
        const point = at(each);
        if (!point || Math.hypot(point.x - drawn.x, point.y - drawn.y) < leastStep) return drawn;
        if (drawn.d.length > longestStroke) return drawn;
        return { d: `${drawn.d}L${point.x} ${point.y}`, ...point };
      }, line),
    );
  };
  const end = () => {
    if (!line) return;
    onChange([...strokes, line.d]);
    setLine(null);
  };

  const drawn = line ? [...strokes, line.d] : strokes;
  return (
    <div className="grid max-w-[37.5rem] gap-2">
      <svg
        ref={field}
        viewBox={`${(strokeBox.width - shownWidth) / 2} 0 ${shownWidth} ${strokeBox.height}`}
        role="img"
        aria-label="Field for the signature; sign on the line"
        className="aspect-5/2 min-h-[120px] w-full min-w-[300px] touch-none rounded border-[1.5px] border-ink bg-leaf"
        onPointerDown={begin}
        onPointerMove={go}
        onPointerUp={end}
        onPointerCancel={end}
      >
        <path d="M80 160H520" stroke="var(--line)" strokeWidth="1.5" />
        {drawn.map((d, index) => (
          <path
            key={index}
            d={d}
            fill="none"
            stroke="var(--ink)"
            strokeWidth="4"
            strokeLinecap="round"
            strokeLinejoin="round"
          />
        ))}
      </svg>
      <div className="flex flex-wrap items-center gap-3">
        <Button disabled={strokes.length === 0} onClick={() => onChange(strokes.slice(0, -1))}>
          Take the last stroke back
        </Button>
        <Button disabled={strokes.length === 0} onClick={() => onChange([])}>
          Clear
        </Button>
        <span role="status" className="text-sm text-ink2">
          {strokes.length === 0
            ? 'Nothing drawn yet.'
            : `${strokes.length} ${strokes.length === 1 ? 'stroke' : 'strokes'} drawn.`}
        </span>
      </div>
    </div>
  );
}
