import styled from 'styled-components';
import { Button, IconButton } from '../../ui/button';
import { Icon } from '../../ui/icon';
import { Progress } from '../../ui/progress';
import type { Upload } from './use-uploads';
import { megabytes } from './upload-rules';

interface UploadRowProps {
  upload: Upload;
  onRetry: () => void;
  onRemove: () => void;
}

/** One file on its way, with its bytes; or why it did not go, and what to do. */
export function UploadRow({ upload, onRetry, onRemove }: UploadRowProps) {
  const { file, problem, canRetry } = upload;
  const { name } = file;
  return (
    <Row>
      <Top>
        <b>{name}</b>
        {!problem && <span className="muted small">{percentSent(upload)}&nbsp;%</span>}
        <IconButton
          icon="x"
          label={problem ? `Remove ${name} from the list` : `Stop the upload of ${name}`}
          onClick={onRemove}
        />
      </Top>
      {problem ? (
        <Problem role="alert">
          <Icon name="warn" size={14} />
          <span>{problem}</span>
        </Problem>
      ) : (
        <Progress label={name} share={percentSent(upload) / 100} detail={detailOf(upload)} hideLabel />
      )}
      {canRetry && (
        <Button size="small" icon="upl" onClick={onRetry}>
          Send again
        </Button>
      )}
    </Row>
  );
}

function percentSent({ sentBytes, file }: Upload): number {
  return Math.floor((sentBytes / file.size) * 100);
}

function detailOf({ sentBytes, file, checking }: Upload): string {
  if (checking) return 'All sent, being checked';
  const sent = megabytes(sentBytes).replace('\u00a0MB', '');
  return `${sent} of ${megabytes(file.size)}`;
}

const Row = styled.li`
  display: grid;
  gap: 6px;
  justify-items: start;
  padding: 10px 16px 12px;
  background: var(--mw-surface);
  border: 1px solid var(--mw-line);
  border-top: 0;
  > * {
    width: 100%;
  }
  > button {
    width: auto;
  }
`;

const Top = styled.div`
  display: flex;
  align-items: center;
  gap: 8px;
  b {
    flex: 1;
    min-width: 0;
    overflow: hidden;
    text-overflow: ellipsis;
    white-space: nowrap;
    font-size: 13px;
  }
`;

const Problem = styled.p`
  display: flex;
  gap: 5px;
  font-size: 13px;
  color: var(--mw-bad);
  span {
    min-width: 0;
    overflow-wrap: anywhere;
  }
  svg {
    margin-top: 2px;
  }
`;
