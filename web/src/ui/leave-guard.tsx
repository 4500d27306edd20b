import { useEffect } from 'react';
import type { ReactNode } from 'react';
import { useBlocker } from 'react-router-dom';
import type { BlockerFunction } from 'react-router-dom';
import { ConfirmDialog } from './dialog';

interface LeaveGuardProps {
  /** Whether something would be lost. */
  when: boolean;
  title: string;
  /** What would be lost. */
  children: ReactNode;
  /** The button that goes on all the same. */
  leave: string;
  /** Which moves to ask about; any unless told. */
  blocks?: BlockerFunction;
}

/** Asks before the address changes or the window closes while something would be lost. */
export function LeaveGuard({ when, ...guard }: LeaveGuardProps) {
  // Set up only while it is needed, because the router listens to one guard at a time: the one set up last.
  return when ? <Guard {...guard} /> : null;
}

function Guard({ title, children, leave, blocks = anyMove }: Omit<LeaveGuardProps, 'when'>) {
  const blocker = useBlocker(blocks);
  useEffect(() => {
    const warn = (event: BeforeUnloadEvent) => event.preventDefault();
    window.addEventListener('beforeunload', warn);
    return () => window.removeEventListener('beforeunload', warn);
  }, []);
  if (blocker.state !== 'blocked') return null;
  return (
    <ConfirmDialog title={title} confirm={leave} danger onConfirm={blocker.proceed} onClose={blocker.reset}>
      {children}
    </ConfirmDialog>
  );
}

const anyMove: BlockerFunction = ({ currentLocation, nextLocation }) =>
  currentLocation.pathname !== nextLocation.pathname;
