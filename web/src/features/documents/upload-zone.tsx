import { useRef, useState } from 'react';
import type { DragEvent } from 'react';
import styled from 'styled-components';
import { Icon } from '../../ui/icon';
import { LeaveGuard } from '../../ui/leave-guard';
import { UploadRow } from './upload-row';
import { ACCEPTED_FILES, ACCEPT_ATTRIBUTE } from './upload-rules';
import { useUploads } from './use-uploads';

interface UploadZoneProps {
  candidateId: string;
  onStored: (fileName: string) => void;
}

/** Takes files by drop or by button, several at once, and shows each on its way. */
export function UploadZone({ candidateId, onStored }: UploadZoneProps) {
  const { uploads, add, retry, remove } = useUploads(candidateId, onStored);
  const [over, setOver] = useState(false);
  const input = useRef<HTMLInputElement>(null);
  const underWay = uploads.filter(({ problem }) => !problem).length;

  function drop(event: DragEvent) {
    event.preventDefault();
    setOver(false);
    add(event.dataTransfer.files);
  }

  return (
    <div>
      <Drop
        $over={over}
        onDragOver={(event) => {
          event.preventDefault();
          setOver(true);
        }}
        onDragLeave={() => setOver(false)}
        onDrop={drop}
      >
        <Icon name="upl" size={24} />
        <div>
          <b>Drop quotes here</b> or{' '}
          <Choose type="button" onClick={() => input.current?.click()} aria-describedby="accepted-files">
            choose files
          </Choose>
          <p id="accepted-files" className="small muted">
            {ACCEPTED_FILES}
          </p>
        </div>
        <input
          ref={input}
          type="file"
          aria-label="Quotes to upload"
          accept={ACCEPT_ATTRIBUTE}
          multiple
          hidden
          onChange={({ target }) => {
            add(Array.from(target.files ?? []));
            target.value = '';
          }}
        />
      </Drop>
      {uploads.length > 0 && (
        <ul aria-label="Uploads">
          {uploads.map((upload) => (
            <UploadRow
              key={upload.id}
              upload={upload}
              onRetry={() => retry(upload)}
              onRemove={() => remove(upload)}
            />
          ))}
        </ul>
      )}
      <LeaveGuard
        when={underWay > 0}
        title={underWay === 1 ? 'One upload is under way' : `${underWay} uploads are under way`}
        leave="Stop and leave"
      >
        Leaving this page stops {underWay === 1 ? 'it' : 'them'}. Nothing is kept of a file that has not
        arrived whole.
      </LeaveGuard>
    </div>
  );
}

const Drop = styled.div<{ $over: boolean }>`
  display: flex;
  gap: 14px;
  align-items: center;
  padding: 18px 16px;
  border: 1.5px dashed var(--mw-line-strong);
  background: var(--mw-surface);
  ${({ $over }) => $over && 'border: 1.5px solid var(--mw-action); background: var(--mw-action-soft);'}
`;

const Choose = styled.button`
  min-height: 24px;
  padding: 0;
  border: 0;
  background: none;
  color: var(--mw-link);
  text-decoration: underline;
  text-underline-offset: 2px;
  cursor: pointer;
`;
