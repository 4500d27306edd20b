import { Link, useSearchParams } from 'react-router-dom';
import styled from 'styled-components';
import { Icon } from './icon';

interface PagerProps {
  page: number;
  pageSize: number;
  total: number;
  /** What is counted, in the plural: "candidates". */
  noun: string;
}

/** "1–50 of 146" and numbered pages as links that keep the rest of the address. No pages for a single one. */
export function Pager({ page, pageSize, total, noun }: PagerProps) {
  const [params] = useSearchParams();
  const pages = Math.max(1, Math.ceil(total / pageSize));
  const first = total === 0 ? 0 : (page - 1) * pageSize + 1;
  const to = (number: number) => {
    const next = new URLSearchParams(params);
    if (number === 1) next.delete('page');
    else next.set('page', String(number));
    return `?${next}`;
  };
  return (
    <>
      <span>
        {first}–{Math.min(page * pageSize, total)} of {total} <span className="visually-hidden">{noun}</span>
      </span>
      {pages > 1 && (
        <Nav aria-label={`Pages of ${noun}`}>
          {page > 1 && (
            <Link to={to(page - 1)} aria-label="Previous page">
              <Icon name="left" />
            </Link>
          )}
          {pagesToShow(page, pages).map((number, index) =>
            number === undefined ? (
              <span key={`gap-${index}`}>…</span>
            ) : (
              <Link
                key={number}
                to={to(number)}
                aria-label={`Page ${number}`}
                aria-current={number === page ? 'page' : undefined}
              >
                {number}
              </Link>
            ),
          )}
          {page < pages && (
            <Link to={to(page + 1)} aria-label="Next page">
              <Icon name="right" />
            </Link>
          )}
        </Nav>
      )}
    </>
  );
}

/** First, last, and those around the present page; `undefined` stands for a gap. */
export function pagesToShow(page: number, pages: number): (number | undefined)[] {
  const wanted = [1, page - 1, page, page + 1, pages].filter((number) => number >= 1 && number <= pages);
  const numbers = [...new Set(wanted)].sort((a, b) => a - b);
  return numbers.flatMap((number, index) => {
    const before = numbers[index - 1];
    return before !== undefined && number - before > 1 ? [undefined, number] : [number];
  });
}

const Nav = styled.nav`
  display: flex;
  align-items: center;
  gap: 4px;
  margin-left: auto;
  a {
    display: grid;
    place-items: center;
    min-width: 28px;
    height: 28px;
    padding: 0 4px;
    color: var(--mw-ink);
    text-decoration: none;
    border: 1px solid transparent;
    border-radius: var(--mw-r-1);
  }
  a:hover {
    background: var(--mw-sunken);
  }
  a[aria-current] {
    font-weight: 700;
    background: var(--mw-rod-soft);
    box-shadow: inset 0 -3px 0 var(--mw-rod-edge);
  }
  @media (pointer: coarse) {
    a {
      min-width: 44px;
      height: 44px;
    }
  }
`;
