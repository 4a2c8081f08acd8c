/**
 * A drawing is data: computed once by pure functions, drawn twice, by React DOM (components/plots/drawing-svg.tsx) and by
 * React-PDF (templates/report/drawing-pdf.tsx). Lengths are in the drawing's own units, y down.
 */
export type Ink =
  | 'ink'
  | 'ink2'
  | 'line'
  | 'hair'
  | 'blue'
  | 'blue-wash'
  | 'brass'
  | 'brass-wash'
  | 'oxide'
  | 'oxide-wash'
  | 'leaf'
  | 'none';

export type DrawingItem =
  | { kind: 'path'; d: string; stroke: Ink; fill?: Ink; widthPx?: number; dash?: number[]; opacity?: number }
  | {
      kind: 'text';
      x: number;
      y: number;
      text: string;
      sizePx: number;
      ink: Ink;
      anchor: 'start' | 'middle' | 'end';
      mono?: boolean;
      weight?: 400 | 500 | 600;
    };

export interface Drawing {
  widthPx: number;
  heightPx: number;
  /** What the drawing says, for somebody who cannot see it. */
  description: string;
  items: DrawingItem[];
}
