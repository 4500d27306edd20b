import { useMemo, useState } from 'react';
import styled from 'styled-components';
import { TextField } from '../../ui/field';
import { Icon } from '../../ui/icon';
import { formatPercent } from '../../lib/money';
import type { Composition, Holding } from './composition';
import { compositionOf } from './composition';
import type { Front } from './front';
import type { Portfolio } from './portfolio';

const SEARCH_FROM = 12;

/** What A is made of, and how many of the kept portfolios hold each candidate. */
export function CompositionList({ front, selected }: { front: Front; selected: Portfolio }) {
  const { portfolios, items } = front;
  const composition = useMemo(() => compositionOf(portfolios, items.length), [portfolios, items]);
  const [search, setSearch] = useState('');
  const words = search.trim().toLowerCase();
  const found = (holdings: readonly Holding[]) =>
    holdings.filter(({ item }) => textOf(items[item]!).includes(words));
  const picked = new Set(selected.picks);
  const groups = groupsOf(composition)
    .map(([name, holdings]) => ({ name, holdings: found(holdings) }))
    .filter(({ holdings }) => holdings.length > 0);
  return (
    <>
      {items.length > SEARCH_FROM && (
        <Search data-screen-only>
          <TextField
            label="Find a candidate"
            icon="search"
            type="search"
            value={search}
            onChange={(event) => setSearch(event.target.value)}
          />
        </Search>
      )}
      <Head aria-hidden>
        <span>In A</span>
        <span>Share of the kept</span>
      </Head>
      {groups.map(({ name, holdings }) => (
        <section key={name} aria-label={name}>
          <Group>
            <h3>{name}</h3>
            <span>{holdings.length}</span>
          </Group>
          <ul>
            {holdings.map(({ item, share }) => (
              <ItemRow key={item} item={items[item]!} share={share} inA={picked.has(item)} />
            ))}
          </ul>
        </section>
      ))}
      {groups.length === 0 && <Nothing>No candidate of this run is named so.</Nothing>}
    </>
  );
}

function groupsOf({ of, inAll, inSome, inNone }: Composition): [name: string, holdings: Holding[]][] {
  return [
    [`In all ${of} kept portfolios`, inAll],
    ['In some', inSome],
    ['In none', inNone],
  ];
}

type Item = Front['items'][number];

function textOf({ code, name, siteName, departmentName, vendorName }: Item): string {
  return [code, name, siteName, departmentName, vendorName].join(' ').toLowerCase();
}

function ItemRow({ item, share, inA }: { item: Item; share: number; inA: boolean }) {
  return (
    <Row $inA={inA} title={`${item.code} ${item.name}, ${item.siteName}, ${item.vendorName}`}>
      <Peg $inA={inA} role="img" aria-label={inA ? 'In A:' : 'Not in A:'} />
      <span>{item.name}</span>
      {item.mandatory ? <Icon name="lock" size={13} label="Mandatory" /> : <i />}
      <Bar aria-hidden>{share > 0 && <i style={{ width: `${share * 100}%` }} />}</Bar>
      <Share>{shareText(share)}</Share>
    </Row>
  );
}

/** "all", "96 %", "none"; a share is never rounded to either end. */
function shareText(share: number): string {
  if (share === 1) return 'all';
  if (share === 0) return 'none';
  if (share > 0.995) return `> ${formatPercent(0.99)}`;
  if (share < 0.005) return `< ${formatPercent(0.01)}`;
  return formatPercent(share);
}

const Search = styled.div`
  padding: 0 16px 8px;
`;

const Head = styled.div`
  display: flex;
  justify-content: space-between;
  padding: 0 16px 4px;
  font-size: 12px;
  color: var(--mw-ink-2);
`;

const Group = styled.div`
  display: flex;
  align-items: center;
  justify-content: space-between;
  height: 27px;
  padding: 0 16px;
  font-size: 12px;
  color: var(--mw-ink-2);
  background: var(--mw-sunken);
  h3 {
    font-size: 12px;
    font-weight: 600;
  }
`;

const Row = styled.li<{ $inA: boolean }>`
  display: grid;
  grid-template-columns: 12px minmax(0, 1fr) 14px 48px 38px;
  gap: 7px;
  align-items: center;
  min-height: 25px;
  padding: 0 16px;
  font-size: 13px;
  color: ${({ $inA }) => ($inA ? 'inherit' : 'var(--mw-ink-2)')};
  > :nth-child(2) {
    line-height: 1.25;
    padding-block: 3px;
    font-weight: ${({ $inA }) => ($inA ? 600 : 400)};
  }
  @media print {
    break-inside: avoid;
  }
`;

const Peg = styled.span<{ $inA: boolean }>`
  width: 12px;
  height: 12px;
  border: 1.5px solid ${({ $inA }) => ($inA ? 'var(--mw-chart-kept)' : 'var(--mw-line-strong)')};
  background: ${({ $inA }) => ($inA ? 'var(--mw-chart-kept)' : 'none')};
  @media (forced-colors: active) {
    forced-color-adjust: none;
    border-color: CanvasText;
    background: ${({ $inA }) => ($inA ? 'CanvasText' : 'Canvas')};
  }
`;

const Bar = styled.span`
  position: relative;
  height: 8px;
  background: var(--mw-sunken);
  i {
    position: absolute;
    inset: 0 auto 0 0;
    background: var(--mw-rod);
    border-right: 2px solid var(--mw-rod-edge);
  }
  @media (forced-colors: active) {
    outline: 1px solid CanvasText;
  }
`;

const Share = styled.span`
  font-size: 12px;
  text-align: right;
  white-space: nowrap;
`;

const Nothing = styled.p`
  padding: 12px 16px;
  font-size: 13px;
  color: var(--mw-ink-2);
`;
