import { useEffect, useRef } from 'react';
import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import { useQuery } from '@apollo/client/react';
import styled from 'styled-components';
import { canChangeContents } from '../../lib/can-change-contents';
import { errorMessage } from '../../lib/error-code';
import { useCan } from '../../lib/use-can';
import { Button } from '../../ui/button';
import { Notice } from '../../ui/notice';
import { SidePanel } from '../../ui/side-panel';
import { Skeleton } from '../../ui/skeleton';
import { CANDIDATE_DETAILS, TAKES } from './candidate-details';
import type { CandidateDetailsFragment } from './candidate-details.generated';
import type { CandidatePanelQuery, CandidatePanelQueryVariables } from './candidate-panel.generated';
import { EditCandidateDialog } from './edit-candidate-dialog';
import { PanelAlternatives } from './panel-alternatives';
import { PanelFigures } from './panel-figures';
import { PanelLinks } from './panel-links';
import { PanelSiteNeeds } from './panel-site-needs';
import { PanelTakesUp } from './panel-takes-up';
import type { FormChoices } from './candidate-fields';

const CANDIDATE_PANEL: TypedDocumentNode<CandidatePanelQuery, CandidatePanelQueryVariables> = gql`
  query CandidatePanel($id: ID!, $roundId: ID!) {
    candidate(id: $id) {
      ...CandidateDetails
    }
    round(id: $roundId) {
      ...Takes
    }
  }
  ${CANDIDATE_DETAILS}
  ${TAKES}
`;

interface CandidatePanelProps {
  roundId: string;
  candidateId: string;
  choices: FormChoices;
  editing: boolean;
  onEdit: (open: boolean) => void;
  onClose: () => void;
}

/** The chosen candidate beside the table. */
export function CandidatePanel({
  roundId,
  candidateId,
  choices,
  editing,
  onEdit,
  onClose,
}: CandidatePanelProps) {
  const can = useCan();
  const { data, error } = useQuery(CANDIDATE_PANEL, {
    variables: { id: candidateId, roundId },
    fetchPolicy: 'cache-and-network',
  });
  const candidate = data?.candidate;
  const editable = data && can('updateCandidate') && canChangeContents(data.round.stage);
  return (
    <SidePanel
      title={candidate?.name ?? 'Candidate'}
      over={candidate && `${candidate.code} · ${candidate.department.name}, ${candidate.site.name}`}
      onClose={onClose}
      footer={<>{editable && <Button onClick={() => onEdit(true)}>Edit</Button>}</>}
    >
      <Focused key={candidateId}>
        {error && !candidate && <Notice tone="bad" title={errorMessage(error)} />}
        {!candidate && !error && <Skeleton rows={10} />}
        {candidate && <Details roundId={roundId} candidate={candidate} limits={data.round.limits} />}
      </Focused>
      {candidate && editable && editing && (
        <EditCandidateDialog candidate={candidate} choices={choices} onClose={() => onEdit(false)} />
      )}
    </SidePanel>
  );
}

interface DetailsProps {
  roundId: string;
  candidate: CandidateDetailsFragment;
  limits: CandidatePanelQuery['round']['limits'];
}

function Details({ roundId, candidate, limits }: DetailsProps) {
  return (
    <>
      {candidate.need && <p className="small">{candidate.need}</p>}
      <PanelFigures candidate={candidate} />
      {candidate.mandatory && (
        <section>
          <h3>Mandatory</h3>
          <p className="small">{candidate.mandatoryReason}</p>
        </section>
      )}
      <PanelAlternatives roundId={roundId} candidate={candidate} />
      <PanelLinks candidate={candidate} />
      <PanelTakesUp candidate={candidate} limits={limits} />
      <PanelSiteNeeds needs={candidate.siteNeeds} />
    </>
  );
}

/** Takes the focus when it appears, so that the keyboard goes on in the panel and Esc closes it. */
function Focused({ children }: { children: React.ReactNode }) {
  const start = useRef<HTMLDivElement>(null);
  useEffect(() => start.current?.focus({ preventScroll: true }), []);
  return (
    <Stack ref={start} tabIndex={-1}>
      {children}
    </Stack>
  );
}

const Stack = styled.div`
  display: grid;
  gap: 16px;
  outline: none;
  h3 {
    margin-bottom: 4px;
  }
`;
