import { Link, useSearchParams } from 'react-router-dom';
import styled from 'styled-components';
import { pageOf } from './table-pages';

/** Between the chart and its equal, the table; the table opens on the page that holds A. */
export function ViewSwitch({ table, at }: { table: boolean; at: number }) {
  const [params] = useSearchParams();
  return (
    <Place>
      <Link to={`?${switched(params, table, at)}`} preventScrollReset>
        {table ? 'Show as chart' : 'Show as table'}
      </Link>
    </Place>
  );
}

function switched(params: URLSearchParams, table: boolean, at: number): URLSearchParams {
  const next = new URLSearchParams(params);
  next.delete('page');
  if (table) next.delete('view');
  else {
    next.set('view', 'table');
    if (pageOf(at) > 1) next.set('page', String(pageOf(at)));
  }
  return next;
}

const Place = styled.p`
  margin-left: auto;
  font-size: 13px;
  a {
    padding: 2px 0;
  }
`;
