import type { ReactNode } from 'react';
import styled from 'styled-components';
import { Icon } from './icon';
import type { IconName } from './icon';

type Tone = 'good' | 'caution' | 'bad' | 'info';

interface NoticeProps {
  tone: Tone;
  /** What happened, with the figures. */
  title: string;
  /** What is safe, what next. */
  children?: ReactNode;
  /** Ways out as buttons. */
  actions?: ReactNode;
  /** Spoken at once when it appears after something the person did. */
  alert?: boolean;
}

const ICONS: Record<Tone, IconName> = { good: 'ok', caution: 'warn', bad: 'warn', info: 'help' };

/** A message at the top of the content, or beside what it is about: square, with a 4 px edge. */
export function Notice({ tone, title, children, actions, alert = false }: NoticeProps) {
  return (
    <Box $tone={tone} role={alert ? 'alert' : undefined}>
      <Icon name={ICONS[tone]} size={18} />
      <Words>
        <Title>{title}</Title>
        {children && <Text>{children}</Text>}
      </Words>
      {actions && <Actions>{actions}</Actions>}
    </Box>
  );
}

const COLOURS: Record<Tone, [edge: string, ground: string]> = {
  good: ['--mw-good', '--mw-good-soft'],
  caution: ['--mw-caution', '--mw-caution-soft'],
  bad: ['--mw-bad', '--mw-bad-soft'],
  info: ['--mw-sea', '--mw-sea-soft'],
};

const Box = styled.div<{ $tone: Tone }>`
  display: flex;
  flex-wrap: wrap;
  gap: 8px 12px;
  align-items: flex-start;
  padding: 12px 16px;
  border-left: 4px solid var(${({ $tone }) => COLOURS[$tone][0]});
  background: var(${({ $tone }) => COLOURS[$tone][1]});
  > svg {
    margin-top: 1px;
    color: var(${({ $tone }) => COLOURS[$tone][0]});
  }
`;

const Words = styled.div`
  flex: 1;
  min-width: min(100%, 200px);
`;

const Title = styled.p`
  font-weight: 600;
`;

const Text = styled.div`
  font-size: 13px;
  max-width: 76ch;
`;

const Actions = styled.div`
  display: flex;
  flex-wrap: wrap;
  gap: 8px;
`;
