import { Injectable } from '@nestjs/common';
import { alternativesAt, type Picks, type Problem } from '@metewand/frontier';
import { InvalidInputError } from '../common/domain-error.js';
import { TenantDatabase } from '../tenancy/tenant-database.js';
import { Run } from './entities/run.entity.js';
import type { PointAlternatives } from './models/run-parts.model.js';
import { RunRows } from './run-rows.js';
import { pointViews } from './run-views.js';
import { ALTERNATIVES_EFFORT } from './search-settings.js';

/** What else there is at a point of a run. */
@Injectable()
export class RunAlternativesService {
  constructor(private readonly db: TenantDatabase) {}

  async ofPoint({ id, number, costAxis }: Run, pointIndex: number): Promise<PointAlternatives> {
    const { problem, items, progress, result } = await this.db.transaction((em) =>
      em.findOneOrFail(Run, {
        where: { id },
        select: { id: true, problem: true, items: true, progress: true, result: true },
      }),
    );
    const at = result ?? progress;
    const point = at?.points[pointIndex];
    if (!at || !point) {
      const message = `Run ${number} has no portfolio with the index ${pointIndex}.`;
      throw new InvalidInputError([{ field: 'pointIndex', message }]);
    }
    const { count, isExact, nextBest } = alternativesAt(problem, picksOf(problem, point.picks), {
      above: at.points[pointIndex - 1]?.benefit ?? 0,
      effort: ALTERNATIVES_EFFORT,
    });
    const rows = nextBest ? [new RunRows(problem).point(nextBest)] : [];
    const [view] = pointViews({ ...at, points: rows }, items, costAxis);
    return { count, isExact, nextBest: view ?? null };
  }
}

function picksOf({ items }: Problem, picks: readonly number[]): Picks {
  return Object.fromEntries(picks.map((index) => [items[index].id, 1]));
}
