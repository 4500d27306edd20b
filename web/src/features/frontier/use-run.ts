import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import { useApolloClient, useQuery, useSuspenseQuery } from '@apollo/client/react';
import { useEffect, useRef, useState } from 'react';
import { client } from '../../lib/apollo';
import { RUN_FIELDS, RUN_PROGRESS_FIELDS } from './run-fields';
import type { RunFieldsFragment } from './run-fields.generated';
import { isActive } from './run-state';
import type {
  RunNewsQuery,
  RunNewsQueryVariables,
  RunProgressQuery,
  RunProgressQueryVariables,
  RunQuery,
  RunQueryVariables,
} from './use-run.generated';

/**
 * Most searches end within a second or two, and that is to show at once: so the one word whether it goes on is asked
 * for often at first, and the many points each second.
 */
const YOUNG = { pollMs: 150, untilMs: 10_000 };
const POLL_MS = 1_000;

const RUN: TypedDocumentNode<RunQuery, RunQueryVariables> = gql`
  query Run($id: ID!) {
    run(id: $id) {
      ...RunFields
    }
  }
  ${RUN_FIELDS}
`;

const RUN_NEWS: TypedDocumentNode<RunNewsQuery, RunNewsQueryVariables> = gql`
  query RunNews($id: ID!) {
    run(id: $id) {
      id
      state
    }
  }
`;

const RUN_PROGRESS: TypedDocumentNode<RunProgressQuery, RunProgressQueryVariables> = gql`
  query RunProgress($id: ID!) {
    run(id: $id) {
      ...RunProgressFields
    }
  }
  ${RUN_PROGRESS_FIELDS}
`;

export type Run = RunFieldsFragment;

/** For the loader. A run that has ended never changes, so what the cache holds of it is still true. */
export async function loadRun(id: string): Promise<void> {
  const cached = client.readQuery({ query: RUN, variables: { id } });
  if (cached && !isActive(cached.run.state)) return;
  await client.query({ query: RUN, variables: { id }, fetchPolicy: 'network-only' });
}

/** The run, with its news until it ends. `error` tells that the last question got no answer. */
export function useRun(id: string): { run: Run; error: unknown } {
  const { run } = useSuspenseQuery(RUN, { variables: { id } }).data;
  const active = isActive(run.state);
  const asking = { variables: { id }, skip: !active, skipPollAttempt: () => document.hidden };
  const { error } = useQuery(RUN_PROGRESS, { ...asking, pollInterval: POLL_MS });
  const news = useQuery(RUN_NEWS, {
    ...asking,
    pollInterval: useYoung(active) ? YOUNG.pollMs : POLL_MS,
    // what it says must not stand beside the points of before
    fetchPolicy: 'no-cache',
  });
  const hasEnded = news.data !== undefined && !isActive(news.data.run.state);
  useWholeResultAtTheEnd(id, active && !hasEnded);
  return { run, error: active ? (error ?? news.error) : undefined };
}

/** Whether it has only just been active: of a run opened later, the age does not matter, its news do. */
function useYoung(active: boolean): boolean {
  const [young, setYoung] = useState(true);
  useEffect(() => {
    if (!active) return;
    const timer = setTimeout(() => setYoung(false), YOUNG.untilMs);
    return () => clearTimeout(timer);
  }, [active]);
  return young;
}

/** The points that were looked at come only with the result, and are too many to ask for each second. */
function useWholeResultAtTheEnd(id: string, active: boolean) {
  const apollo = useApolloClient();
  const wasActive = useRef(active);
  useEffect(() => {
    const ended = wasActive.current && !active;
    wasActive.current = active;
    if (ended) void apollo.query({ query: RUN, variables: { id }, fetchPolicy: 'network-only' });
  }, [apollo, id, active]);
}
