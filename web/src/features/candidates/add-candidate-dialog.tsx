import type { CandidateFieldsInput } from '../../generated/graphql';
import { announce } from '../../ui/announce';
import { CandidateDialog } from './candidate-dialog';
import type { FormChoices } from './candidate-fields';
import { useSaveCandidate } from './use-save-candidate';

interface AddCandidateDialogProps {
  roundId: string;
  choices: FormChoices;
  onAdded: (candidateId: string) => void;
  onClose: () => void;
}

const BLANK: CandidateFieldsInput = {
  name: '',
  need: '',
  departmentId: '',
  siteId: '',
  kind: 'REPLACEMENT',
  genericGroup: '',
  quantity: 1,
  usefulLifeYears: 8,
  residualPercent: '0',
  worksNet: '0',
  consumablesYearly: '0',
  energyYearly: '0',
  currentRunningYearly: '0',
  installationDays: '0',
  floorAreaM2: '0',
  mandatory: false,
  mandatoryReason: '',
};

export function AddCandidateDialog({ roundId, choices, onAdded, onClose }: AddCandidateDialogProps) {
  const { create } = useSaveCandidate();
  return (
    <CandidateDialog
      title="Add a candidate"
      sub="A piece of equipment that someone needs. Quotes and scores come later."
      submit="Add candidate"
      initial={BLANK}
      choices={choices}
      save={(fields) => create({ roundId, fields })}
      onSaved={({ id, code }) => {
        announce(`Candidate ${code} added`);
        onAdded(id);
      }}
      onClose={onClose}
    />
  );
}
