import styled from 'styled-components';
import { Tag } from '../../ui/tag';
import type { Run } from './use-run';

/** Candidates the search could not choose, with the reason; what is mandatory among them needs someone. */
export function LeftOutList({ leftOut }: { leftOut: Run['leftOut'] }) {
  if (leftOut.length === 0) return null;
  return (
    <Place aria-label="Left out before the search">
      <h3>
        Left out before the search <span>{leftOut.length}</span>
      </h3>
      <ul>
        {leftOut.map(({ candidateId, code, name, reason, mandatory }) => (
          <li key={candidateId}>
            <b>{name}</b> <span className="muted">{code}</span>
            {mandatory && (
              <Mandatory tone="caution" icon="warn">
                Mandatory
              </Mandatory>
            )}
            <p className="muted">{reason}</p>
          </li>
        ))}
      </ul>
    </Place>
  );
}

const Place = styled.section`
  font-size: 13px;
  h3 {
    display: flex;
    align-items: center;
    justify-content: space-between;
    height: 27px;
    padding: 0 16px;
    font-size: 12px;
    font-weight: 600;
    color: var(--mw-ink-2);
    background: var(--mw-sunken);
    span {
      font-weight: 400;
    }
  }
  li {
    padding: 6px 16px;
    border-bottom: 1px solid var(--mw-line);
  }
`;

const Mandatory = styled(Tag)`
  margin-left: 8px;
`;
