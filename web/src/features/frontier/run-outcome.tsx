import { Notice } from '../../ui/notice';
import { Notes, OpenLimits } from './start-refused';
import type { Run } from './use-run';

/** Why a run has no portfolios to show, or what it has to say beside them. */
export function RunOutcome({ run }: { run: Run }) {
  const { state, number, failure, notes, points } = run;
  if (state === 'FAILED')
    return (
      <Notice tone="bad" title={`Run ${number} stopped: ${failure ?? 'it did not come to its end.'}`}>
        Earlier runs and the round’s figures are safe. Run again to repeat the search.
      </Notice>
    );
  if (state === 'INFEASIBLE')
    return (
      <Notice tone="bad" title={`Run ${number}: the limits cannot be met together.`} actions={<OpenLimits />}>
        <Notes notes={notes} />
      </Notice>
    );
  if (notes.length === 0) return null;
  return (
    <Notice
      tone="caution"
      title={points.length === 0 ? `Run ${number} found no portfolio.` : `Run ${number} has a remark.`}
      actions={points.length === 0 && <OpenLimits />}
    >
      <Notes notes={notes} />
    </Notice>
  );
}
