import { useState } from 'react';
import type { ReactNode } from 'react';
import styled from 'styled-components';
import { formatInstant } from '../../lib/dates';
import { errorMessage } from '../../lib/error-code';
import { useCan } from '../../lib/use-can';
import { announce } from '../../ui/announce';
import { Icon } from '../../ui/icon';
import type { ListedDocumentFragment } from './document-list.generated';
import { megabytes } from './upload-rules';
import { useOpenDocument } from './use-open-document';

export function DocumentRow({ document, aside }: { document: ListedDocumentFragment; aside?: ReactNode }) {
  const { fileName, sizeBytes, uploadedBy, createdAt } = document;
  return (
    <Row>
      <Icon name="doc" />
      <div>
        <FileName id={document.id} name={fileName} />
        <p className="tiny muted">
          {megabytes(sizeBytes)} · {uploadedBy.name},{' '}
          <time dateTime={createdAt}>{formatInstant(createdAt)}</time>
        </p>
        {aside && <Aside>{aside}</Aside>}
      </div>
    </Row>
  );
}

function FileName({ id, name }: { id: string; name: string }) {
  const can = useCan();
  const openDocument = useOpenDocument();
  const [opening, setOpening] = useState(false);
  if (!can('openDocument')) return <b>{name}</b>;
  async function open() {
    setOpening(true);
    try {
      await openDocument(id);
    } catch (error) {
      announce(errorMessage(error));
    } finally {
      setOpening(false);
    }
  }
  return (
    <Open type="button" aria-label={`Download ${name}`} disabled={opening} onClick={() => void open()}>
      {name}
    </Open>
  );
}

const Row = styled.li`
  display: grid;
  grid-template-columns: 16px minmax(0, 1fr);
  gap: 10px;
  padding: 9px 16px;
  border-top: 1px solid var(--mw-line);
  line-height: 1.3;
  > svg {
    margin-top: 3px;
    color: var(--mw-ink-2);
  }
`;

const Open = styled.button`
  display: block;
  max-width: 100%;
  min-height: 24px;
  padding: 0;
  border: 0;
  background: none;
  color: var(--mw-ink);
  font-weight: 600;
  text-align: left;
  overflow: hidden;
  text-overflow: ellipsis;
  white-space: nowrap;
  cursor: pointer;
  &:hover {
    color: var(--mw-link);
    text-decoration: underline;
  }
`;

const Aside = styled.div`
  margin-top: 6px;
`;
