import { paths } from '../../lib/paths';
import { ButtonLink } from '../../ui/button';
import { Empty } from '../../ui/empty';
import { Section } from '../../ui/section';

/** Before anything was submitted: what belongs here, and where it comes from. */
export function NoSelectionYet({ roundId }: { roundId: string }) {
  return (
    <Section>
      <Empty
        title="No portfolio has been sent for approval yet"
        actions={
          <ButtonLink to={paths.frontier(roundId)} variant="primary">
            Open the frontier
          </ButtonLink>
        }
      >
        The purchasing coordinator chooses a portfolio on the frontier and sends it. The finance director,
        never the same person, then approves it, returns it with a comment or declines it. The memo and every
        step stay here.
      </Empty>
    </Section>
  );
}
