import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import { useQuery } from '@apollo/client/react';
import type { VendorNamesQuery, VendorNamesQueryVariables } from './vendor-names.generated';

const VENDOR_NAMES: TypedDocumentNode<VendorNamesQuery, VendorNamesQueryVariables> = gql`
  query VendorNames {
    vendors {
      id
      name
    }
  }
`;

/** Vendors known so far, offered while typing; none until they have arrived. */
export function useVendorNames(): string[] {
  const { data } = useQuery(VENDOR_NAMES, { fetchPolicy: 'cache-and-network' });
  return data?.vendors.map(({ name }) => name) ?? [];
}
