import { useRef, useState } from 'react';
import type { FormEvent } from 'react';
import styled from 'styled-components';
import { Button } from '../../ui/button';
import { TextField } from '../../ui/field';
import { Notice } from '../../ui/notice';
import { useSignIn } from './use-sign-in';

interface Problems {
  email?: string;
  password?: string;
  refused?: string;
}

export function SignInForm({ onSignedIn }: { onSignedIn: () => void }) {
  const { signIn, loading } = useSignIn();
  const [problems, setProblems] = useState<Problems>({});
  const email = useRef<HTMLInputElement>(null);
  const password = useRef<HTMLInputElement>(null);

  async function submit(event: FormEvent<HTMLFormElement>) {
    event.preventDefault();
    const form = new FormData(event.currentTarget);
    const typed = { email: text(form, 'email').trim(), password: text(form, 'password') };
    const missing = check(typed);
    setProblems(missing);
    if (missing.email) return email.current?.focus();
    if (missing.password) return password.current?.focus();
    const refused = await signIn(typed.email, typed.password);
    if (!refused) return onSignedIn();
    setProblems({ refused });
    password.current?.select();
  }

  return (
    <Form onSubmit={submit} noValidate>
      {problems.refused && <Notice tone="bad" title={problems.refused} alert />}
      <TextField
        ref={email}
        label="E-mail"
        name="email"
        type="email"
        autoComplete="username"
        autoFocus
        required
        spellCheck={false}
        autoCapitalize="none"
        error={problems.email}
      />
      <TextField
        ref={password}
        label="Password"
        name="password"
        type="password"
        autoComplete="current-password"
        required
        error={problems.password}
      />
      <Button type="submit" variant="primary" size="large" block loading={loading}>
        Sign in
      </Button>
    </Form>
  );
}

function text(form: FormData, name: string): string {
  const value = form.get(name);
  return typeof value === 'string' ? value : '';
}

function check({ email, password }: { email: string; password: string }): Problems {
  return {
    email: /^[^\s@]+@[^\s@]+$/u.test(email)
      ? undefined
      : 'Write your e-mail address, such as name@clinic.example.',
    password: password ? undefined : 'Write your password.',
  };
}

const Form = styled.form`
  display: grid;
  gap: 16px;
`;
