import { useEffect, useState } from 'react';
import { useSearchParams } from 'react-router-dom';
import { bestUnderCeiling, dearestWithin } from './portfolio';
import type { Portfolio } from './portfolio';

const WRITE_AFTER_MS = 250;

export interface Chosen {
  /** Place of the selected portfolio. */
  a: number;
  /** Place of the compared one. */
  b: number | undefined;
  select: (place: number) => void;
  /** Puts B on A, or takes B away where it stands on A already. */
  compare: () => void;
}

interface Costs {
  a?: string;
  b?: string;
}

/**
 * The selected and the compared portfolio, kept in the address by their cost (`?a=2300556.00&b=…`): a cost means the
 * same while a search goes on, a place in the list does not. The address follows a little later, so that dragging
 * along the rod is not a navigation per portfolio.
 */
export function useChosen(portfolios: readonly Portfolio[]): Chosen {
  const [params, setParams] = useSearchParams();
  const [costs, setCosts] = useState<Costs>(() => costsIn(params));
  const address = params.toString();
  const [read, setRead] = useState(address);
  const [written, setWritten] = useState(costs);
  if (read !== address) {
    setRead(address);
    // What we wrote ourselves comes back late: by then A may stand elsewhere. Only links and Back move it.
    if (!same(costsIn(params), written)) {
      setWritten(costsIn(params));
      setCosts(costsIn(params));
    }
  }
  useEffect(() => {
    if (same(costs, costsIn(params))) return;
    const timer = setTimeout(() => {
      setWritten(costs);
      setParams((before) => withCosts(before, costs), { replace: true, preventScrollReset: true });
    }, WRITE_AFTER_MS);
    return () => clearTimeout(timer);
  }, [costs, params, setParams]);

  const a = placeOf(portfolios, costs.a) ?? bestUnderCeiling(portfolios);
  const b = placeOf(portfolios, costs.b);
  const costAt = (place: number) => portfolios[place]!.exact.cost.amount;
  return {
    a,
    b,
    select: (place) => setCosts((before) => ({ ...before, a: costAt(place) })),
    compare: () => setCosts({ a: costAt(a), b: a === b ? undefined : costAt(a) }),
  };
}

function costsIn(params: URLSearchParams): Costs {
  return { a: params.get('a') ?? undefined, b: params.get('b') ?? undefined };
}

function same(one: Costs, other: Costs): boolean {
  return one.a === other.a && one.b === other.b;
}

function withCosts(before: URLSearchParams, costs: Costs): URLSearchParams {
  const next = new URLSearchParams(before);
  for (const letter of ['a', 'b'] as const) {
    const cost = costs[letter];
    if (cost) next.set(letter, cost);
    else next.delete(letter);
  }
  return next;
}

function placeOf(portfolios: readonly Portfolio[], cost: string | undefined): number | undefined {
  const value = Number(cost);
  if (cost === undefined || !Number.isFinite(value)) return undefined;
  return Math.max(0, dearestWithin(portfolios, value));
}
