import { useState } from 'react';
import { useCan } from '../../lib/use-can';
import { useViewer } from '../../lib/viewer';
import { Notice } from '../../ui/notice';
import { Section } from '../../ui/section';
import { DecideForm } from './decide-form';
import type { SelectionMemo } from './selection-memo';

/** The decision, for who may take it. */
export function DecisionBox({ selection }: { selection: SelectionMemo }) {
  const can = useCan();
  const { membership } = useViewer();
  // Kept here, because the form goes once somebody else has decided, and the reason must not go with it.
  const [refusal, setRefusal] = useState<string>();
  const open = selection.state === 'SUBMITTED';
  if (!can('decideSelection') || (!open && !refusal)) return null;
  const own = membership.id === selection.submittedBy.id;
  return (
    <Section title="Your decision" padded>
      {refusal && <Notice tone="bad" title={refusal} alert />}
      {open && own && <p>You sent this portfolio yourself, so somebody else has to decide on it.</p>}
      {open && !own && <DecideForm selection={selection} onRefused={setRefusal} />}
    </Section>
  );
}
