import { useId } from 'react';
import type { ReactNode } from 'react';
import { Dialog as PrimerDialog } from '@primer/react';
import type { DialogHeaderProps, DialogWidth } from '@primer/react';
import styled from 'styled-components';
import { Button, IconButton } from './button';

interface DialogProps {
  title: string;
  sub?: string;
  onClose: () => void;
  /** Buttons, main one first. */
  footer?: ReactNode;
  width?: DialogWidth;
  /** "right" makes it a sheet along the window's edge. */
  position?: 'center' | 'right';
  children: ReactNode;
}

/** A modal dialog: focus stays inside, Esc closes, focus goes back to where it came from. */
export function Dialog({
  title,
  sub,
  onClose,
  footer,
  width = 'large',
  position = 'center',
  children,
}: DialogProps) {
  return (
    <PrimerDialog
      title={title}
      subtitle={sub}
      onClose={onClose}
      width={width}
      position={{ narrow: 'fullscreen', regular: position }}
      renderHeader={Header}
      renderFooter={() => (footer ? <Footer>{footer}</Footer> : <></>)}
    >
      {children}
    </PrimerDialog>
  );
}

interface ConfirmProps {
  title: string;
  children: ReactNode;
  /** Verb and object, such as "Remove the limit". */
  confirm: string;
  onConfirm: () => void;
  onClose: () => void;
  danger?: boolean;
  loading?: boolean;
}

/** Asks once more. Only for what cannot be undone. */
export function ConfirmDialog({
  title,
  children,
  confirm,
  onConfirm,
  onClose,
  danger,
  loading,
}: ConfirmProps) {
  return (
    <Dialog
      title={title}
      onClose={onClose}
      width="medium"
      footer={
        <>
          <Button variant={danger ? 'danger' : 'primary'} onClick={onConfirm} loading={loading}>
            {confirm}
          </Button>
          <Button onClick={onClose}>Cancel</Button>
        </>
      }
    >
      {children}
    </Dialog>
  );
}

function Header({ title, subtitle, dialogLabelId, dialogDescriptionId, onClose }: DialogHeaderProps) {
  const ownId = useId();
  return (
    <Top>
      <div>
        <h2 id={dialogLabelId}>{title}</h2>
        <p id={dialogDescriptionId ?? ownId} className="muted small">
          {subtitle}
        </p>
      </div>
      <IconButton icon="x" label="Close" variant="quiet" onClick={() => onClose('close-button')} />
    </Top>
  );
}

const Top = styled.div`
  display: flex;
  justify-content: space-between;
  align-items: flex-start;
  gap: 12px;
  padding: 16px 16px 4px;
`;

const Footer = styled.div`
  display: flex;
  flex-direction: row-reverse;
  justify-content: flex-start;
  flex-wrap: wrap;
  gap: 8px;
  padding: 12px 16px 16px;
`;
