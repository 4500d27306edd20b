import { useId } from 'react';
import type {
  InputHTMLAttributes,
  ReactNode,
  Ref,
  SelectHTMLAttributes,
  TextareaHTMLAttributes,
} from 'react';
import { Checkbox, TextInput, Textarea } from '@primer/react';
import styled from 'styled-components';
import { Icon } from './icon';
import type { IconName } from './icon';

interface FieldProps {
  label: string;
  /** How to write it; the error takes its place. */
  help?: ReactNode;
  /** How to write it right. */
  error?: string;
  /** Beside the label, such as a link. */
  labelAside?: ReactNode;
}

/** What a control needs so that label, help and error belong to it. */
interface Wiring {
  id: string;
  'aria-describedby'?: string;
  'aria-invalid'?: true;
}

/** Label above, control, help or error below. `children` gets the attributes that tie them together. */
function Field({
  label,
  help,
  error,
  labelAside,
  children,
}: FieldProps & { children: (wiring: Wiring) => ReactNode }) {
  const id = useId();
  const noteId = `${id}-note`;
  const note = error ? <FieldError>{error}</FieldError> : help;
  return (
    <div>
      <LabelLine>
        <label htmlFor={id}>{label}</label>
        {labelAside}
      </LabelLine>
      {children({
        id,
        'aria-describedby': note ? noteId : undefined,
        'aria-invalid': error ? true : undefined,
      })}
      {note && <Note id={noteId}>{note}</Note>}
    </div>
  );
}

type TextFieldProps = FieldProps &
  Omit<InputHTMLAttributes<HTMLInputElement>, 'size'> & {
    icon?: IconName;
    size?: 'medium' | 'large';
    /** Quiet unit at the right inside the field, such as "weeks". */
    unit?: string;
    ref?: Ref<HTMLInputElement>;
  };

export function TextField({ label, help, error, labelAside, icon, unit, size, ...input }: TextFieldProps) {
  return (
    <Field {...{ label, help, error, labelAside }}>
      {(wiring) => (
        <TextInput
          block
          size={size}
          validationStatus={error ? 'error' : undefined}
          leadingVisual={icon && <Icon name={icon} />}
          trailingVisual={unit}
          {...input}
          {...wiring}
          aria-describedby={both(wiring['aria-describedby'], input['aria-describedby'])}
        />
      )}
    </Field>
  );
}

/** A field may be described by its own note and by something beside it. */
function both(...ids: (string | undefined)[]): string | undefined {
  return ids.filter(Boolean).join(' ') || undefined;
}

export function TextAreaField({
  label,
  help,
  error,
  labelAside,
  rows = 3,
  ...input
}: FieldProps & TextareaHTMLAttributes<HTMLTextAreaElement> & { ref?: Ref<HTMLTextAreaElement> }) {
  return (
    <Field {...{ label, help, error, labelAside }}>
      {(wiring) => (
        <Textarea
          block
          rows={rows}
          resize="vertical"
          validationStatus={error ? 'error' : undefined}
          {...input}
          {...wiring}
        />
      )}
    </Field>
  );
}

export interface Choice {
  value: string;
  label: string;
}

export function SelectField({
  label,
  help,
  error,
  labelAside,
  options,
  placeholder,
  ...select
}: FieldProps &
  Omit<SelectHTMLAttributes<HTMLSelectElement>, 'size'> & {
    options: readonly Choice[];
    placeholder?: string;
    ref?: Ref<HTMLSelectElement>;
  }) {
  return (
    <Field {...{ label, help, error, labelAside }}>
      {(wiring) => <Select options={options} placeholder={placeholder} {...select} {...wiring} />}
    </Field>
  );
}

/** A bare select for toolbars, where `aria-label` stands in for the label. */
export function Select({
  options,
  placeholder,
  ...select
}: Omit<SelectHTMLAttributes<HTMLSelectElement>, 'size'> & {
  options: readonly Choice[];
  placeholder?: string;
  ref?: Ref<HTMLSelectElement>;
}) {
  return (
    <SelectBox>
      <select {...select}>
        {placeholder && <option value="">{placeholder}</option>}
        {options.map((option) => (
          <option key={option.value} value={option.value}>
            {option.label}
          </option>
        ))}
      </select>
      <Icon name="down" />
    </SelectBox>
  );
}

export function CheckboxField({
  label,
  help,
  ...input
}: { label: string; help?: ReactNode } & Omit<InputHTMLAttributes<HTMLInputElement>, 'value'> & {
    value?: string;
  }) {
  const id = useId();
  return (
    <CheckLine>
      <Checkbox {...input} id={id} aria-describedby={help ? `${id}-note` : undefined} />
      <label htmlFor={id}>{label}</label>
      {help && <Note id={`${id}-note`}>{help}</Note>}
    </CheckLine>
  );
}

/** Fields one below the other; `columns` of them side by side where there is room. */
export const FieldGrid = styled.div<{ $columns?: number }>`
  display: grid;
  gap: 16px;
  align-items: start;
  grid-template-columns: repeat(
    auto-fit,
    minmax(min(100%, max(160px, 90% / ${({ $columns = 1 }) => $columns})), 1fr)
  );
`;

function FieldError({ children }: { children: ReactNode }) {
  return (
    <ErrorText>
      <Icon name="warn" size={14} />
      {children}
    </ErrorText>
  );
}

const LabelLine = styled.div`
  display: flex;
  align-items: baseline;
  justify-content: space-between;
  gap: 12px;
  margin-bottom: 4px;
  label {
    font-weight: 600;
  }
`;

const Note = styled.div`
  margin-top: 4px;
  font-size: 13px;
  color: var(--mw-ink-2);
`;

const ErrorText = styled.span`
  display: flex;
  gap: 5px;
  font-weight: 500;
  color: var(--mw-bad);
  svg {
    margin-top: 2px;
  }
`;

const CheckLine = styled.div`
  display: grid;
  grid-template-columns: auto 1fr;
  column-gap: 8px;
  align-items: center;
  min-height: 24px;
  ${Note} {
    grid-column: 2;
    margin-top: 0;
  }
`;

const SelectBox = styled.span`
  position: relative;
  display: block;
  select {
    appearance: none;
    width: 100%;
    height: 36px;
    padding: 0 32px 0 10px;
    border: 1px solid var(--mw-line-strong);
    border-radius: var(--mw-r-2);
    background: var(--mw-raised);
    color: var(--mw-ink);
    text-overflow: ellipsis;
  }
  select[aria-invalid] {
    border: 2px solid var(--mw-bad);
  }
  select:disabled {
    background: var(--mw-sunken);
    color: var(--mw-ink-3);
  }
  svg {
    position: absolute;
    right: 10px;
    top: 10px;
    pointer-events: none;
  }
`;
