import { gql } from '@apollo/client';
import { beforeEach, expect, test } from 'vitest';
import { fakeLink, refusal } from '../test/fake-link';
import { client, session, withSession } from './apollo';
import { errorCode } from './error-code';

const VENDORS = gql`
  query Vendors {
    vendors {
      id
    }
  }
`;
const ROUND = gql`
  query Round($id: ID!) {
    round(id: $id) {
      id
    }
  }
`;

beforeEach(async () => {
  session.end('signed-out');
  await client.clearStore();
});

test('shares one renewal among requests that are refused at the same time', async () => {
  session.start('old');
  const onlyNew = () => {
    if (link.asked.at(-1)?.token !== 'new') throw refusal('UNAUTHENTICATED');
  };
  const link = fakeLink({
    RefreshSession: { refreshSession: { __typename: 'SignedIn', accessToken: 'new' } },
    Vendors: () => (onlyNew(), { vendors: [] }),
    Round: ({ id }) => (onlyNew(), { round: { __typename: 'Round', id } }),
  });
  client.setLink(withSession(link));
  const ask = (id: string) => client.query({ query: ROUND, variables: { id } });
  await Promise.all([client.query({ query: VENDORS }), ask('a'), ask('b'), ask('c')]);
  expect(link.asked.filter(({ operation }) => operation === 'RefreshSession')).toHaveLength(1);
  expect(session.token()).toBe('new');
});

test('ends the session when even the new token is refused', async () => {
  session.start('old');
  const ends: string[] = [];
  const stop = session.onEnd((why) => ends.push(why));
  const link = fakeLink({
    RefreshSession: { refreshSession: { __typename: 'SignedIn', accessToken: 'new' } },
    Vendors: () => {
      throw refusal('UNAUTHENTICATED');
    },
  });
  client.setLink(withSession(link));
  await expect(client.query({ query: VENDORS })).rejects.toSatisfy(
    (error) => errorCode(error) === 'UNAUTHENTICATED',
  );
  stop();
  expect(ends).toEqual(['expired']);
  expect(link.asked.filter(({ operation }) => operation === 'Vendors')).toHaveLength(2);
});

test('keeps the session when the renewal fails for another reason', async () => {
  const ends: string[] = [];
  const stop = session.onEnd((why) => ends.push(why));
  client.setLink(
    withSession(
      fakeLink({
        RefreshSession: () => {
          throw refusal('INTERNAL_SERVER_ERROR');
        },
      }),
    ),
  );
  await expect(client.query({ query: VENDORS })).rejects.toThrow();
  stop();
  expect(ends).toEqual([]);
});
