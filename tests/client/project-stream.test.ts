import fc from 'fast-check';
import { ProjectStream } from '@/client/project-stream';
import type { ProjectEvent } from '@/shared/contracts/projects';

const projectId = '01900000-0000-7000-8000-000000000001';
const eventOf = (eventNumber: number): ProjectEvent => ({
  projectId,
  eventNumber,
  kind: 'message.posted',
  subjectId: String(eventNumber),
  actor: { id: projectId, name: 'Ines' },
  at: '2026-01-01T00:00:00.000Z',
  payload: null,
});
const settle = async () => {
  for (let turn = 0; turn < 20; turn += 1) await Promise.resolve();
};

/** A server that numbers events, and a line on which everything can go wrong. */
class World {
  head = 0;
  /** Further behind than this, it says "read afresh". */
  farBehind = Infinity;
  atOnce = Infinity;
  failures = 0;
  asked = 0;
  seen: number[] = [];
  afresh = 0;
  private underWay: (() => void)[] = [];
  readonly stream: ProjectStream;

  constructor(startAt = 0) {
    this.head = startAt;
    this.seen = Array.from({ length: startAt }, (_, at) => at + 1);
    this.stream = new ProjectStream({
      startAt,
      readEvents: (after) => this.answer(after),
      apply: (events) => events.forEach((event) => this.seen.push(event.eventNumber)),
      readAfresh: () => {
        this.afresh += 1;
        // What is read afresh may hold more than was asked for: it is read later.
        this.seen = this.all().filter((number) => number <= this.stream.lastApplied);
      },
      pause: () => new Promise((resolve) => this.underWay.push(resolve)),
    });
  }

  all(): number[] {
    return Array.from({ length: this.head }, (_, at) => at + 1);
  }

  land(): void {
    this.underWay.shift()?.();
  }

  get waits(): boolean {
    return this.underWay.length > 0;
  }

  private answer(after: number) {
    this.asked += 1;
    const isBehind = this.head - after > this.farBehind || after > this.head;
    const numbers = isBehind ? [] : this.all().slice(after, after + this.atOnce);
    const reply = { events: numbers.map(eventOf), head: this.head, readAfresh: isBehind };
    const fails = this.failures > 0;
    if (fails) this.failures -= 1;
    return new Promise<typeof reply>((resolve, reject) =>
      this.underWay.push(() => (fails ? reject(new Error('cut off')) : resolve(reply))),
    );
  }
}

type Step = { act: 'commit' | 'push' | 'head' | 'join' | 'land' | 'fail'; at: number };
const step: fc.Arbitrary<Step> = fc.record({
  act: fc.constantFrom('commit', 'commit', 'push', 'push', 'push', 'head', 'join', 'land', 'land', 'fail'),
  at: fc.nat(12),
});

async function play(world: World, steps: readonly Step[]): Promise<void> {
  for (const { act, at } of steps) {
    const number = world.head === 0 ? 0 : 1 + (at % world.head);
    if (act === 'commit') world.head += 1 + (at % 3);
    // Doubled, late and out of order; what is not chosen is lost.
    if (act === 'push' && number > 0) world.stream.push(eventOf(world.head - number + 1));
    if (act === 'head') world.stream.head(Math.max(0, world.head - (at % 4)));
    if (act === 'join') world.stream.joined(world.head);
    if (act === 'land') world.land();
    if (act === 'fail') world.failures += 1;
    await settle();
  }
  world.failures = 0;
  world.stream.head(world.head);
  for (let turn = 0; turn < 500 && (world.waits || world.stream.lastApplied < world.head); turn += 1) {
    world.land();
    await settle();
  }
}

describe('the stream of a project', () => {
  test('gives every event once and in order, whatever the line does', async () => {
    await fc.assert(
      fc.asyncProperty(
        fc.array(step, { maxLength: 60 }),
        fc.integer({ min: 1, max: 9 }),
        async (steps, atOnce) => {
          const world = new World();
          world.atOnce = atOnce;
          await play(world, steps);
          expect(world.seen).toEqual(world.all());
          expect(world.stream.lastApplied).toBe(world.head);
        },
      ),
      { numRuns: 300 },
    );
  });

  test('ends at the same when the server says to read everything afresh', async () => {
    await fc.assert(
      fc.asyncProperty(
        fc.array(step, { maxLength: 60 }),
        fc.integer({ min: 0, max: 5 }),
        async (steps, far) => {
          const world = new World();
          world.farBehind = far;
          await play(world, steps);
          expect(world.seen).toEqual(world.all());
        },
      ),
      { numRuns: 300 },
    );
  });

  test('asks nothing while events come in order, some of them twice', () => {
    const world = new World(4);
    world.head = 6;
    world.stream.push(eventOf(5));
    world.stream.push(eventOf(6));
    world.stream.push(eventOf(5)); // doubled
    world.stream.head(6);
    expect(world.seen).toEqual([1, 2, 3, 4, 5, 6]);
    expect(world.asked).toBe(0);
  });

  test('holds what came too early and asks once for the gap', async () => {
    const world = new World();
    world.head = 4;
    world.stream.push(eventOf(3));
    world.stream.push(eventOf(4));
    expect(world.seen).toEqual([]);
    world.land();
    await settle();
    expect(world.seen).toEqual([1, 2, 3, 4]);
  });

  test('reads once afresh when an older copy of the database was restored, and goes on from there', async () => {
    const world = new World(9);
    world.head = 5;
    world.stream.joined(5);
    world.land();
    await settle();
    expect(world.stream.lastApplied).toBe(5);
    expect(world.afresh).toBe(1);
    world.head = 6;
    world.stream.push(eventOf(6));
    expect(world.seen).toEqual([1, 2, 3, 4, 5, 6]);
    expect(world.asked).toBe(1);
  });

  test('does not ask for ever for an event that the server does not have', async () => {
    const world = new World(2);
    world.stream.push(eventOf(7));
    for (let turn = 0; turn < 10; turn += 1) {
      world.land();
      await settle();
    }
    expect(world.asked).toBeLessThanOrEqual(2);
    expect(world.seen).toEqual([1, 2]);
  });

  test('applies nothing after it was stopped', async () => {
    const world = new World();
    world.head = 2;
    world.stream.head(2);
    world.stream.stop();
    world.land();
    await settle();
    world.stream.push(eventOf(1));
    expect(world.seen).toEqual([]);
  });
});
