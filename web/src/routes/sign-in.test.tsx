import { screen, waitFor } from '@testing-library/react';
import { expect, test } from 'vitest';
import { aViewer } from '../test/factories';
import { fakeLink } from '../test/fake-link';
import { renderRoute } from '../test/render-route';

function signInLink() {
  return fakeLink({
    SignIn: ({ input }) =>
      (input as { password: string }).password === 'right'
        ? { signIn: { __typename: 'SignedIn', accessToken: 'token-2' } }
        : {
            signIn: {
              __typename: 'SignInRefused',
              message: 'That e-mail and password do not belong together.',
            },
          },
    Viewer: { viewer: aViewer() },
  });
}

test('signs in and goes on to the page that was asked for', async () => {
  const link = signInLink();
  const { user, where } = await renderRoute('/sign-in?to=%2Frounds%2Fround-1%2Flimits', link, {
    token: null,
  });
  await user.type(await screen.findByLabelText('E-mail'), 'hanne.vos@alderbrook.example');
  await user.type(screen.getByLabelText('Password'), 'right');
  await user.click(screen.getByRole('button', { name: 'Sign in' }));
  await waitFor(() => expect(where()).toBe('/rounds/round-1/limits'));
  expect(link.asked.find(({ operation }) => operation === 'Viewer')?.token).toBe('token-2');
});

test('says that e-mail and password do not belong together, and keeps the e-mail', async () => {
  const { user, where } = await renderRoute('/sign-in', signInLink(), { token: null });
  await user.type(await screen.findByLabelText('E-mail'), 'hanne.vos@alderbrook.example');
  await user.type(screen.getByLabelText('Password'), 'wrong{Enter}');
  expect(await screen.findByRole('alert')).toHaveTextContent(
    'That e-mail and password do not belong together.',
  );
  expect(screen.getByLabelText('E-mail')).toHaveValue('hanne.vos@alderbrook.example');
  expect(screen.getByLabelText('Password')).toHaveFocus();
  expect(where()).toBe('/sign-in');
});

test('asks for what is missing before it asks the server', async () => {
  const link = signInLink();
  const { user } = await renderRoute('/sign-in', link, { token: null });
  await user.click(await screen.findByRole('button', { name: 'Sign in' }));
  expect(screen.getByLabelText('E-mail')).toHaveAccessibleDescription(/Write your e-mail address/);
  expect(screen.getByLabelText('E-mail')).toBeInvalid();
  expect(screen.getByLabelText('E-mail')).toHaveFocus();
  expect(link.asked).toEqual([]);
});

test('never leaves for another site', async () => {
  const { user, where } = await renderRoute('/sign-in?to=%2F%2Fevil.example', signInLink(), { token: null });
  await user.type(await screen.findByLabelText('E-mail'), 'hanne.vos@alderbrook.example');
  await user.type(screen.getByLabelText('Password'), 'right{Enter}');
  await waitFor(() => expect(where()).toBe('/rounds/round-1/overview'));
});
