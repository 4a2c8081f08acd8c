import type { Drawing, DrawingItem, Ink } from '@/components/plots/drawing';

const colour = (ink: Ink) => (ink === 'none' ? 'none' : `var(--${ink})`);

/**
 * A drawing on the screen. It takes the width of its place and never grows above its own; `fixed` keeps its own size (marks in a line
 * of text). `decorative`: the words stand beside it already.
 */
export function DrawingSvg(props: { drawing: Drawing; fixed?: boolean; decorative?: boolean; className?: string }) {
  const { drawing, fixed, decorative, className } = props;
  const size = fixed
    ? { width: drawing.widthPx, height: drawing.heightPx }
    : { width: '100%', style: { maxWidth: drawing.widthPx, height: 'auto', display: 'block' } };
  const viewBox = `0 0 ${drawing.widthPx} ${drawing.heightPx}`;
  const items = drawing.items.map((item, index) => <DrawnItem key={index} item={item} />);
  if (decorative) {
    return (
      <svg {...size} viewBox={viewBox} className={className} aria-hidden="true" focusable="false">
        {items}
      </svg>
    );
  }
  return (
    <svg {...size} viewBox={viewBox} className={className} role="img" aria-label={drawing.description}>
      {items}
    </svg>
  );
}

function DrawnItem({ item }: { item: DrawingItem }) {
  if (item.kind === 'path') {
    return (
      <path
        d={item.d}
        stroke={colour(item.stroke)}
        fill={colour(item.fill ?? 'none')}
        strokeWidth={item.widthPx ?? 1.5}
        strokeDasharray={item.dash?.join(' ')}
        opacity={item.opacity}
      />
    );
  }
  return (
    <text
      x={item.x}
      y={item.y}
      fill={colour(item.ink)}
      fontSize={item.sizePx}
      textAnchor={item.anchor}
      fontWeight={item.weight}
      className={item.mono ? 'font-mono' : 'font-sans'}
    >
      {item.text}
    </text>
  );
}
