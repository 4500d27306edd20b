import styled from 'styled-components';
import { formatPercent } from '../../lib/money';
import { Pager } from '../../ui/pager';

interface TableFooterProps {
  page: number;
  pageSize: number;
  total: number;
  all: number;
  /** Share, 0.035 for 3.5 %. */
  discountRate: string;
}

/** What the columns mean, how many of all are left, and the pages. */
export function TableFooter({ page, pageSize, total, all, discountRate }: TableFooterProps) {
  return (
    <>
      <Pager page={page} pageSize={pageSize} total={total} noun="candidates" />
      {total < all && <span>of {all} in the round</span>}
      <Meaning>
        By the quote in force, with VAT. Life-cycle cost is discounted at{' '}
        {formatPercent(Number(discountRate), 1)}.
      </Meaning>
    </>
  );
}

const Meaning = styled.span`
  order: -1;
  width: 100%;
`;
