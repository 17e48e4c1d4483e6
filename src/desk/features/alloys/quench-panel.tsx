import { useMemo } from 'react';
import type { QuenchRule } from '#shared/domain/alloy/quench-rule.ts';
import { ordering } from '#shared/metallurgy/index.ts';
import { StateMark } from '#src/ui/state-mark.tsx';
import { Panel } from './panel.tsx';
import { quenchWords } from '../../parts/quench-words.ts';

/** When to quench and why, and whether the metal orders when it cools slowly. */
export const QuenchPanel = ({
  quench,
  compositionWt,
}: {
  readonly quench: QuenchRule;
  readonly compositionWt: Readonly<Record<string, number>>;
}) => {
  const order = useMemo(() => ordering(compositionWt), [compositionWt]);
  return (
    <Panel title="Quench">
      <p className="text-lg font-black">Quench {quenchWords(quench)}</p>
      <p>{quench.why}</p>
      {order.withinModel && order.needsEarlyQuench ? (
        <StateMark state="caution" text="Needs an early quench" size="row" />
      ) : null}
      <p className="text-[15px] text-soft">
        <span className="font-extrabold">Source of the rule: </span>
        {quench.source}
      </p>
      <p>
        <span className="font-extrabold">Ordering: </span>
        {order.withinModel ? order.rule : `not computed. ${order.reason}`}
      </p>
      {order.withinModel ? (
        <p className="text-[15px] text-soft">
          <span className="font-extrabold">Source: </span>
          {order.source}
        </p>
      ) : null}
    </Panel>
  );
};
