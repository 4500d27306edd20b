import type { ReactNode } from 'react';
import { Label } from '@primer/react';
import styled from 'styled-components';
import { Icon } from './icon';
import type { IconName } from './icon';

export type TagTone = 'plain' | 'mandatory' | 'good' | 'caution' | 'bad' | 'needs' | 'overlaps';

// Our tones stand for meanings; Primer's variants are only the hooks that primer-shape.css colours.
const VARIANTS = {
  plain: 'default',
  mandatory: 'accent',
  good: 'success',
  caution: 'attention',
  bad: 'danger',
  needs: 'done',
  overlaps: 'sponsors',
} as const;

interface TagProps {
  tone?: TagTone;
  icon?: IconName;
  className?: string;
  children: ReactNode;
}

/** Notched tag for a flag or a state. The words carry the meaning, tone and icon repeat it. */
export function Tag({ tone = 'plain', icon, className, children }: TagProps) {
  return (
    <Notched variant={VARIANTS[tone]} className={className}>
      {icon && <Icon name={icon} size={12} />}
      {children}
    </Notched>
  );
}

const Notched = styled(Label)`
  display: inline-flex;
  align-items: center;
  gap: 5px;
  max-width: 100%;
  font-size: 12px;
  line-height: 1;
  white-space: nowrap;
`;
