import { Random } from '../src/local-search/random.js';
import { WidestFirst } from '../src/proof/widest-first.js';

describe('the widest first', () => {
  it('comes out in order of gap, equals in order of arrival, however adding and taking take turns', () => {
    const random = new Random(1);
    const heap = new WidestFirst<number>();
    let waiting: { gap: number; turn: number }[] = [];
    for (let turn = 0; turn < 2_000; turn++) {
      if (random.fraction() < 0.55) {
        const gap = random.below(40);
        heap.add(gap, turn);
        waiting.push({ gap, turn });
      } else {
        waiting.sort((one, other) => other.gap - one.gap || one.turn - other.turn);
        expect(heap.take()).toBe(waiting[0]?.turn);
        waiting = waiting.slice(1);
      }
      expect(heap.size).toBe(waiting.length);
    }
    expect(new Set(heap.values())).toEqual(new Set(waiting.map(({ turn }) => turn)));
  });

  it('has nothing to give where nothing is', () => {
    expect(new WidestFirst<number>().take()).toBeUndefined();
  });
});
