import { useSyncExternalStore } from 'react';
import { AriaStatus } from '@primer/react';
import styled from 'styled-components';
import { Icon } from './icon';
import { IconButton } from './button';

interface News {
  id: number;
  text: string;
}

const SHOWN_MS = 8_000;
let news: News | undefined;
let timer: ReturnType<typeof setTimeout> | undefined;
let count = 0;
const listeners = new Set<() => void>();

/** Says and shows what an action came to, such as "Approved". For results only; errors belong beside their cause. */
export function announce(text: string): void {
  show({ id: ++count, text });
}

function show(next: News | undefined) {
  clearTimeout(timer);
  news = next;
  if (next) timer = setTimeout(() => show(undefined), SHOWN_MS);
  listeners.forEach((listener) => listener());
}

/** Where announcements appear. Once per page. */
export function Announcements() {
  const current = useSyncExternalStore(subscribe, () => news);
  return (
    <Place aria-label="Messages" data-screen-only>
      <AriaStatus announceOnShow>{current?.text}</AriaStatus>
      {current && (
        <Toast key={current.id}>
          <Icon name="ok" />
          <span aria-hidden>{current.text}</span>
          <IconButton icon="x" label="Close message" variant="quiet" onClick={() => show(undefined)} />
        </Toast>
      )}
    </Place>
  );
}

function subscribe(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

const Place = styled.section`
  position: fixed;
  left: 50%;
  bottom: 24px;
  z-index: 40;
  translate: -50%;
  max-width: calc(100vw - 32px);
  > :first-child {
    position: absolute;
    width: 1px;
    height: 1px;
    overflow: hidden;
    clip-path: inset(50%);
  }
`;

const Toast = styled.div`
  display: flex;
  align-items: center;
  gap: 10px;
  padding: 8px 8px 8px 14px;
  border-left: 4px solid var(--mw-good);
  border-radius: var(--mw-r-1);
  background: var(--mw-raised);
  box-shadow: var(--mw-shadow);
  outline: 1px solid var(--mw-line-strong);
  font-weight: 600;
  > svg {
    color: var(--mw-good);
  }
`;
