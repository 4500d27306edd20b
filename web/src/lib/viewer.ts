import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import { useSuspenseQuery } from '@apollo/client/react';
import { client } from './apollo';
import { setConventions } from './conventions';
import type { ViewerQuery, ViewerQueryVariables } from './viewer.generated';

/** Who is signed in, for which organisation, and the rounds of that organisation. */
export const VIEWER: TypedDocumentNode<ViewerQuery, ViewerQueryVariables> = gql`
  query Viewer {
    viewer {
      email
      membership {
        id
        name
        title
        roles
      }
      organisation {
        id
        name
        currency
        locale
        timeZone
        demo
        sites {
          id
          code
          name
        }
      }
      memberships {
        organisationId
        organisationName
        roles
      }
      rounds {
        id
        name
        stage
        openedOn
        scoringClosesOn
        decisionDate
        counts {
          candidates
          quotes
          quotesToSettle
          scoresMissing
        }
      }
    }
  }
`;

export type Viewer = ViewerQuery['viewer'];
export type ViewerRound = Viewer['rounds'][number];

/** Loads the viewer and takes over how the organisation writes numbers and dates. */
export async function loadViewer(): Promise<Viewer> {
  const { data } = await client.query({ query: VIEWER });
  const { viewer } = data!;
  setConventions(viewer.organisation);
  return viewer;
}

/** The viewer, on any page below the signed-in layout, whose loader has fetched it. */
export function useViewer(): Viewer {
  return useSuspenseQuery(VIEWER).data.viewer;
}

/** The round people work in: the newest that is not closed, else the newest. */
export function currentRound(rounds: readonly ViewerRound[]): ViewerRound | undefined {
  return rounds.find((round) => round.stage !== 'CLOSED') ?? rounds[0];
}
