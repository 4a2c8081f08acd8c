import { DrawingSvg } from '@/components/plots/drawing-svg';
import { type LimitRuleInput, limitRule } from '@/components/plots/limit-rule-geometry';

/** The limit rule of a result; see limitRule for what it draws. `compact` is for table rows and has no figures. */
export function LimitRule(props: Omit<LimitRuleInput, 'widthPx'> & { widthPx?: number; className?: string }) {
  const { className, widthPx = props.compact ? 120 : 600, ...input } = props;
  return <DrawingSvg drawing={limitRule({ ...input, widthPx })} fixed={props.compact} className={className} />;
}
