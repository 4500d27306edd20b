import { useState } from 'react';
import type { CandidateFieldsInput } from '../../generated/graphql';
import { useReload } from '../../lib/use-reload';
import { announce } from '../../ui/announce';
import { Button } from '../../ui/button';
import { Notice } from '../../ui/notice';
import type { CandidateDetailsFragment } from './candidate-details.generated';
import { CandidateDialog } from './candidate-dialog';
import type { FormChoices } from './candidate-fields';
import { LABELS } from './candidate-labels';
import { useSaveCandidate } from './use-save-candidate';

interface EditCandidateDialogProps {
  /** The candidate as it now is; it may change beneath the dialog. */
  candidate: CandidateDetailsFragment;
  choices: FormChoices;
  onClose: () => void;
}

export function EditCandidateDialog({ candidate, choices, onClose }: EditCandidateDialogProps) {
  const { update } = useSaveCandidate();
  const reload = useReload();
  const [base, setBase] = useState(candidate);
  const [version, setVersion] = useState(candidate.version);
  const [conflict, setConflict] = useState(false);

  function takeTheirs() {
    setBase(candidate);
    keepMine();
  }

  function keepMine() {
    setVersion(candidate.version);
    setConflict(false);
  }

  return (
    <CandidateDialog
      // A new base draws the form anew, with what is saved now.
      key={base.version}
      title={`Edit ${base.code}`}
      submit="Save candidate"
      initial={fieldsOf(base)}
      choices={choices}
      save={(fields) => update({ id: candidate.id, version, fields })}
      onSaved={({ code }) => {
        announce(`Candidate ${code} saved`);
        onClose();
      }}
      onConflict={async () => {
        await reload();
        setConflict(true);
      }}
      onClose={onClose}
      notice={
        conflict && (
          <Conflict
            changed={changedLabels(base, candidate)}
            onTakeTheirs={takeTheirs}
            onKeepMine={keepMine}
          />
        )
      }
    />
  );
}

interface ConflictProps {
  changed: readonly string[];
  onTakeTheirs: () => void;
  onKeepMine: () => void;
}

function Conflict({ changed, onTakeTheirs, onKeepMine }: ConflictProps) {
  return (
    <Notice
      tone="caution"
      alert
      title="Somebody else saved this candidate meanwhile"
      actions={
        <>
          <Button onClick={onTakeTheirs}>Take theirs</Button>
          <Button onClick={onKeepMine}>Go on with mine</Button>
        </>
      }
    >
      Nothing of yours was saved, and what you typed stands below.
      {changed.length > 0 && ` They changed: ${changed.join(', ')}.`}
    </Notice>
  );
}

function changedLabels(before: CandidateDetailsFragment, after: CandidateDetailsFragment): string[] {
  const [old, now] = [fieldsOf(before), fieldsOf(after)];
  return (Object.keys(LABELS) as (keyof CandidateFieldsInput)[])
    .filter((field) => old[field] !== now[field])
    .map((field) => LABELS[field]);
}

function fieldsOf(candidate: CandidateDetailsFragment): CandidateFieldsInput {
  const { name, need, kind, genericGroup, quantity, usefulLifeYears, residualPercent } = candidate;
  const { installationDays, floorAreaM2, mandatory, mandatoryReason } = candidate;
  return {
    name,
    need,
    departmentId: candidate.department.id,
    siteId: candidate.site.id,
    kind,
    genericGroup,
    quantity,
    usefulLifeYears,
    residualPercent,
    worksNet: candidate.worksNet.amount,
    consumablesYearly: candidate.consumablesYearly.amount,
    energyYearly: candidate.energyYearly.amount,
    currentRunningYearly: candidate.currentRunningYearly.amount,
    installationDays,
    floorAreaM2,
    mandatory,
    mandatoryReason,
  };
}
