import type { ButtonHTMLAttributes, ReactNode, Ref } from 'react';
import { Button as PrimerButton } from '@primer/react';
import { Link } from 'react-router-dom';
import type { LinkProps } from 'react-router-dom';
import styled from 'styled-components';
import { Icon } from './icon';
import type { IconName } from './icon';

interface Look {
  /** One `primary` per screen; `danger` only to decline and to remove; `quiet` has no edge. */
  variant?: 'default' | 'primary' | 'danger' | 'quiet';
  size?: 'small' | 'medium' | 'large';
  icon?: IconName;
  trailingIcon?: IconName;
  /** Fills its container. */
  block?: boolean;
}

type ButtonProps = Look &
  ButtonHTMLAttributes<HTMLButtonElement> & {
    /** Shows a spinner and takes no second press. */
    loading?: boolean;
    ref?: Ref<HTMLButtonElement>;
    children: ReactNode;
  };

export function Button({
  variant = 'default',
  icon,
  trailingIcon,
  type = 'button',
  children,
  ...rest
}: ButtonProps) {
  return (
    <PrimerButton variant={primerVariant(variant)} type={type} {...visuals(icon, trailingIcon)} {...rest}>
      {children}
    </PrimerButton>
  );
}

/** A link that looks like a button: for going somewhere, not for doing something. */
export function ButtonLink({
  variant = 'default',
  icon,
  trailingIcon,
  children,
  to,
  ...rest
}: Look & Omit<LinkProps, 'color'> & { children: ReactNode }) {
  return (
    <PrimerButton
      as={Link}
      to={to}
      variant={primerVariant(variant)}
      {...visuals(icon, trailingIcon)}
      {...(rest as object)}
    >
      {children}
    </PrimerButton>
  );
}

interface IconButtonProps extends Omit<
  ButtonHTMLAttributes<HTMLButtonElement>,
  'aria-label' | 'aria-labelledby'
> {
  icon: IconName;
  /** Spoken, and shown as a tooltip. */
  label: string;
  variant?: 'default' | 'quiet';
  size?: 'small' | 'medium' | 'large';
  ref?: Ref<HTMLButtonElement>;
}

export function IconButton({
  icon,
  label,
  variant = 'default',
  size = 'small',
  type = 'button',
  ...rest
}: IconButtonProps) {
  return (
    <Square
      aria-label={label}
      title={label}
      variant={primerVariant(variant)}
      size={size}
      type={type}
      {...rest}
    >
      <Icon name={icon} />
    </Square>
  );
}

function primerVariant(variant: NonNullable<Look['variant']>) {
  return variant === 'quiet' ? 'invisible' : variant;
}

function visuals(icon?: IconName, trailingIcon?: IconName) {
  return {
    leadingVisual: icon && <Icon name={icon} />,
    trailingVisual: trailingIcon && <Icon name={trailingIcon} />,
  };
}

const Square = styled(PrimerButton)`
  flex: none;
  padding: 0;
  aspect-ratio: 1;
  &&[data-variant='invisible'] {
    color: var(--mw-ink);
  }
`;
