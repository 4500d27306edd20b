import { useCan } from '../../lib/use-can';
import { useViewer } from '../../lib/viewer';
import { Section } from '../../ui/section';
import { DecideForm } from './decide-form';
import type { SelectionMemo } from './selection-memo';

/** The decision, for who may take it; for everybody else, who it waits for. */
export function DecisionBox({ selection }: { selection: SelectionMemo }) {
  const can = useCan();
  const { membership } = useViewer();
  if (selection.state !== 'SUBMITTED') return null;
  if (!can('decideSelection')) return null;
  if (membership.id === selection.submittedBy.id) {
    return (
      <Section title="Your decision" padded>
        <p>You sent this portfolio yourself, so somebody else has to decide on it.</p>
      </Section>
    );
  }
  return (
    <Section title="Your decision" padded>
      <DecideForm selection={selection} />
    </Section>
  );
}
