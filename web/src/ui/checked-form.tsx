import { useEffect, useRef } from 'react';
import type { FormEvent, ReactNode } from 'react';
import styled from 'styled-components';
import type { FieldProblems } from '../lib/refusal';
import { Notice } from './notice';

interface CheckedFormProps {
  /** For a submit button outside the form, as in a dialog's footer. */
  id: string;
  onSubmit: (form: HTMLFormElement) => void;
  /** What is wrong, by field name; the same words stand beside the field. */
  problems: FieldProblems;
  /** What is wrong as a whole. */
  message?: string;
  children: ReactNode;
}

/** A form that answers a refusal on top, takes the focus there, and leads to each field to mend. */
export function CheckedForm({ id, onSubmit, problems, message, children }: CheckedFormProps) {
  const form = useRef<HTMLFormElement>(null);
  const summary = useRef<HTMLDivElement>(null);
  const fields = Object.entries(problems);
  useEffect(() => {
    if (message || Object.keys(problems).length > 0) summary.current?.focus();
  }, [problems, message]);

  function submit(event: FormEvent<HTMLFormElement>) {
    event.preventDefault();
    onSubmit(event.currentTarget);
  }

  return (
    <Form id={id} ref={form} onSubmit={submit} noValidate>
      <div ref={summary} tabIndex={-1}>
        {(message || fields.length > 0) && (
          <Notice tone="bad" title={message ?? titleFor(fields.length)} alert>
            {fields.length > 0 && (
              <ul>
                {fields.map(([field, problem]) => (
                  <li key={field}>
                    <ToField type="button" onClick={() => controlOf(form.current, field)?.focus()}>
                      {problem}
                    </ToField>
                  </li>
                ))}
              </ul>
            )}
          </Notice>
        )}
      </div>
      {children}
    </Form>
  );
}

function titleFor(count: number): string {
  return count === 1 ? 'One field is to be mended' : `${count} fields are to be mended`;
}

// A money field keeps its reading in a hidden input; the control a person types in stands just before it.
function controlOf(form: HTMLFormElement | null, name: string): HTMLElement | undefined {
  const named = form?.elements.namedItem(name);
  if (!(named instanceof HTMLElement)) return undefined;
  if (named instanceof HTMLInputElement && named.type === 'hidden')
    return named.previousElementSibling?.querySelector('input') ?? undefined;
  return named;
}

const Form = styled.form`
  display: grid;
  gap: 16px;
  > :first-child:empty {
    display: none;
  }
`;

const ToField = styled.button`
  padding: 2px 0;
  border: 0;
  background: none;
  color: var(--mw-ink);
  text-align: left;
  text-decoration: underline;
  text-underline-offset: 2px;
  cursor: pointer;
`;
