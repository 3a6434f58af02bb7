/** Invented ferry crossings for the report's tests: columns drawn by a seeded generator. */

export interface SampleColumn {
  readonly name: string;
  readonly label: string;
  readonly unit: string | null;
  readonly numbers: Float64Array | null;
  readonly texts: string[] | null;
  /** Levels, baseline first; null where not a category. */
  readonly levels: string[] | null;
}

export interface SampleData {
  readonly n: number;
  readonly columns: Map<string, SampleColumn>;
  readonly response: Float64Array;
}

/** Mulberry32: a small public-domain generator of uniform numbers. */
export function uniform(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let t = state;
    t = Math.imul(t ^ (t >>> 15), t | 1);
    t ^= t + Math.imul(t ^ (t >>> 7), t | 61);
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296;
  };
}

export interface SampleWish {
  readonly n: number;
  readonly log: boolean;
  readonly vessels: readonly string[];
}

export function drawData(wish: SampleWish): SampleData {
  const random = uniform(20240611 + wish.n);
  const normal = (): number => Math.sqrt(-2 * Math.log(1 - random())) * Math.cos(2 * Math.PI * random());
  const { n, vessels } = wish;
  const number = (name: string, label: string, unit: string | null): SampleColumn => ({
    name,
    label,
    unit,
    numbers: new Float64Array(n),
    texts: null,
    levels: null,
  });
  const cargo = number('cargo', 'Cargo', 't');
  const axle = number('axle_load', 'Axle load', 't');
  const speed = number('speed', 'Speed', 'kn');
  const headwind = number('headwind', 'Headwind', 'm/s');
  const hull = number('hull_days', 'Days since hull cleaning', 'd');
  const vessel: SampleColumn = {
    name: 'vessel',
    label: 'Vessel',
    unit: null,
    numbers: null,
    texts: [],
    levels: [...vessels],
  };
  const response = new Float64Array(n);
  for (let i = 0; i < n; i++) {
    const v = Math.floor(random() * vessels.length);
    vessel.texts!.push(vessels[v]!);
    cargo.numbers![i] = Math.round((20 + 120 * random()) * 10) / 10;
    axle.numbers![i] = Math.round((cargo.numbers![i]! / 6 + 0.3 * normal()) * 100) / 100;
    speed.numbers![i] = Math.round((10 + 1.3 * normal()) * 10) / 10;
    headwind.numbers![i] = Math.round((3 + 3.5 * normal()) * 10) / 10;
    hull.numbers![i] = Math.floor(180 * random());
    const mean =
      150 +
      1.6 * cargo.numbers![i]! +
      0.21 * speed.numbers![i]! ** 3 +
      6.5 * headwind.numbers![i]! +
      0.18 * hull.numbers![i]! +
      22 * (v % 4) +
      0.35 * (v === 1 ? cargo.numbers![i]! : 0);
    const spread = 5 + 0.3 * cargo.numbers![i]!;
    const y = wish.log ? mean * Math.exp(0.07 * normal()) : mean + spread * normal();
    response[i] = Math.round(y * 10) / 10;
  }
  // One crossing that went badly, so that there is something to find.
  response[Math.floor(n / 3)] = response[Math.floor(n / 3)]! + (wish.log ? 400 : 190);
  return {
    n,
    response,
    columns: new Map([cargo, axle, speed, headwind, hull, vessel].map((c) => [c.name, c])),
  };
}
