import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import type { LimitRowFragment } from './limit-row.generated';

export const LIMIT_ROW: TypedDocumentNode<LimitRowFragment> = gql`
  fragment LimitRow on Limit {
    id
    version
    name
    measure
    least
    most
    asked
    site {
      id
      name
    }
  }
`;
