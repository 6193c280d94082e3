import { spawnSync } from 'node:child_process';
import { readFileSync } from 'node:fs';
import { cpus } from 'node:os';
import path from 'node:path';
import {
  sampleDraws,
  storage,
  wallState,
  type LayerDescription,
  type StorageDescription,
  type UncertaintyDescription,
} from '../../shared/engine';

/**
 * `npm run bench`: the engine beside the same models in SciPy (test/bench/peer.py), in one run on one core.
 * `npm run -s bench -- --json` prints a list of {name, value, unit, peer, peerValue, ratio}; --no-peer leaves SciPy out.
 */

interface BenchLine {
  name: string;
  value: number;
  unit: string;
  peer: string | null;
  peerValue: number | null;
  /** How many times as long the peer takes. */
  ratio: number | null;
}

/** What peer.py prints. */
interface PeerReport {
  versions: string;
  single_wall_us: number;
  batch_wall_us: number;
  route_ms: number;
  route_rtol: number;
  draws_s: number;
  draws_rtol: number;
  walls: [number, number][];
  batch_walls: [number, number][];
  route_days: (number | null)[];
  draw_days: (number | null)[];
}

const BENCH = path.join(__dirname, '..', '..', 'test', 'bench');
const studies = JSON.parse(readFileSync(path.join(BENCH, 'studies.json'), 'utf8')) as {
  wall: LayerDescription[];
  route: StorageDescription;
  draws: { storage: StorageDescription; uncertainty: UncertaintyDescription };
};

/** The i-th of the walls' environments; the same formula is in peer.py. */
function wallConditions(i: number): Parameters<typeof wallState>[1] {
  return {
    temperature_C: 5 + (i % 300) / 10,
    relative_humidity_outside: 0.45 + (i % 97) / 200,
    relative_humidity_inside: 0.05 + (i % 53) / 160,
    oxygen_pressure_outside_Pa: 20_000,
    oxygen_pressure_inside_Pa: 0,
  };
}

/** Median time of a call [s]; calls much shorter than the clock's step are timed by the batch. */
function medianSeconds(run: (i: number) => void, options: { rounds: number; batch: number }): number {
  const { rounds, batch } = options;
  const spent: number[] = [];
  for (let round = -Math.ceil(rounds / 4); round < rounds; round++) {
    const start = process.hrtime.bigint();
    for (let i = 0; i < batch; i++) run(Math.abs(round) * batch + i);
    // The first quarter warms the machine up.
    if (round >= 0) spent.push(Number(process.hrtime.bigint() - start) / 1e9 / batch);
  }
  return spent.sort((a, b) => a - b)[Math.floor(spent.length / 2)];
}

/** Exponent b of cost ~ size^b between the ends, by least squares in the logarithms: 1 is linear. */
function exponentOf(points: readonly { size: number; seconds: number }[]): number {
  const xs = points.map(({ size }) => Math.log(size));
  const ys = points.map(({ seconds }) => Math.log(seconds));
  const mean = (list: number[]): number => list.reduce((sum, value) => sum + value, 0) / list.length;
  const [mx, my] = [mean(xs), mean(ys)];
  const above = xs.reduce((sum, x, i) => sum + (x - mx) * (ys[i] - my), 0);
  return above / xs.reduce((sum, x) => sum + (x - mx) ** 2, 0);
}

function runPeer(): PeerReport {
  const oneThread = ['OMP_NUM_THREADS=1', 'OPENBLAS_NUM_THREADS=1'];
  const run = spawnSync('/usr/bin/env', [...oneThread, '/usr/bin/python3', path.join(BENCH, 'peer.py')], {
    encoding: 'utf8',
  });
  if (run.status !== 0) {
    throw new Error(`The SciPy script did not end well (apt-get install python3-scipy):\n${run.stderr}`);
  }
  return JSON.parse(run.stdout) as PeerReport;
}

const far = (a: number, b: number): number => Math.abs(a / b - 1);

/** Both sides must have computed the same, or the times say nothing. */
function assertSameAnswers(peer: PeerReport): void {
  [...peer.walls, ...peer.batch_walls].forEach(([water, oxygen], k) => {
    const state = wallState(studies.wall, wallConditions(k % peer.walls.length));
    const off = Math.max(
      far(water, state.water.permeance_mol_per_m2_s_Pa),
      far(oxygen, state.oxygen.permeance_mol_per_m2_s_Pa),
    );
    if (!(off < 1e-8)) throw new Error(`Wall ${k} differs from SciPy's by ${off}.`);
  });
  const check = (name: string, study: StorageDescription, theirs: (number | null)[]): void => {
    const ours = Object.values(storage(study).limits);
    ours.forEach((answer, i) => {
      const days = answer.status === 'reached' ? answer.days : null;
      const isSame = days === null || theirs[i] === null ? days === theirs[i] : far(days, theirs[i]) < 1e-6;
      if (!isSame) throw new Error(`${name}: ${days} days here, ${theirs[i]} in SciPy.`);
    });
  };
  check('The route', studies.route, peer.route_days);
  check('The one-leg study', studies.draws.storage, peer.draw_days);
}

const DRAWS = 10_000;

function drawsSeconds(count: number): number {
  const start = process.hrtime.bigint();
  sampleDraws(studies.draws.storage, studies.draws.uncertainty, { seed: 1, firstDraw: 0, count });
  return Number(process.hrtime.bigint() - start) / 1e9;
}

const median = (values: number[]): number => values.sort((a, b) => a - b)[Math.floor(values.length / 2)];

/** Without limits and with a report on the last day the whole route is followed, however small or large it is. */
const TO_THE_END = { limits: {}, report_days: [730] };

/** The study's wall, repeated to so many layers; the area grows with it, so that the food fares about the same. */
function withLayers(count: number): StorageDescription {
  const layers = Array.from({ length: count }, (_, i) => studies.wall[i % studies.wall.length]);
  const { pack } = studies.route;
  return {
    ...studies.route,
    pack: { ...pack, walls: [{ ...pack.walls[0], area_m2: (0.06 * count) / 7, layers }] },
    ...TO_THE_END,
  };
}

/** The study's route in so many legs over the same two years. */
function withLegs(count: number): StorageDescription {
  const { legs } = studies.route.route;
  return {
    ...studies.route,
    route: {
      legs: Array.from({ length: count }, (_, i) => ({ ...legs[i % legs.length], days: 730 / count })),
      after_last: 'hold',
    },
    ...TO_THE_END,
  };
}

function measure(peer: PeerReport | null): BenchLine[] {
  const lines: BenchLine[] = [];
  const add = (
    name: string,
    [value, unit]: [number, string],
    other?: { peer: string; value: number },
  ): void => {
    lines.push({
      name,
      value,
      unit,
      peer: other?.peer ?? null,
      peerValue: other?.value ?? null,
      ratio: other ? other.value / value : null,
    });
  };
  const one = (i: number): void => void wallState(studies.wall, wallConditions(i));
  const wallUs = 1e6 * medianSeconds(one, { rounds: 400, batch: 50 });
  add(
    'steady seven-layer wall, two layers humidity-dependent',
    [wallUs, 'µs'],
    peer ? { peer: 'Python, one wall at a time', value: peer.single_wall_us } : undefined,
  );
  add(
    'the same, per wall of 1,000',
    [wallUs, 'µs'],
    peer ? { peer: 'NumPy over 1,000 walls at once', value: peer.batch_wall_us } : undefined,
  );
  add(
    'two-year, 24-leg coupled route with that wall, 1e-6',
    [1e3 * medianSeconds(() => void storage(studies.route), { rounds: 100, batch: 1 }), 'ms'],
    peer ? { peer: `SciPy solve_ivp, LSODA, rtol ${peer.route_rtol}`, value: peer.route_ms } : undefined,
  );
  drawsSeconds(500);
  add(
    '10,000 draws of a one-leg coupled study with that wall, 1e-4',
    [median([1, 2, 3].map(() => drawsSeconds(DRAWS))), 's'],
    peer ? { peer: `SciPy solve_ivp, LSODA, rtol ${peer.draws_rtol}`, value: peer.draws_s } : undefined,
  );
  const scale = (name: string, sizes: number[], seconds: (size: number) => number): void => {
    sizes.forEach(seconds);
    const points = sizes.map((size) => ({ size, seconds: seconds(size) }));
    for (const point of points) add(`${name}: ${point.size}`, [point.seconds * 1e3, 'ms']);
    add(`${name}: exponent over a decade`, [exponentOf(points), '1 is linear']);
  };
  const atSize =
    (build: (size: number) => StorageDescription) =>
    (size: number): number => {
      const study = build(size);
      return medianSeconds(() => void storage(study), { rounds: 40, batch: 1 });
    };
  scale('route by layers', [5, 10, 20, 35, 50], atSize(withLayers));
  scale('route by legs', [24, 48, 96, 168, 240], atSize(withLegs));
  scale('study by draws', [1_000, 2_000, 5_000, 10_000], (size) =>
    median([1, 2, 3].map(() => drawsSeconds(size))),
  );
  return lines;
}

function show(lines: BenchLine[], peer: PeerReport | null): void {
  const machine = `${cpus()[0]?.model ?? 'unknown processor'}, Node ${process.version}`;
  process.stdout.write(`${machine}${peer ? `; ${peer.versions}` : ''}; medians, one core\n`);
  for (const { name, value, unit, peer: other, peerValue, ratio } of lines) {
    const beside =
      other === null || peerValue === null || ratio === null
        ? ''
        : `   ${other}: ${peerValue.toPrecision(3)} ${unit}, ${ratio.toPrecision(3)} times as long`;
    process.stdout.write(`${name.padEnd(64)} ${value.toPrecision(3).padStart(8)} ${unit}${beside}\n`);
  }
}

function main(args: string[]): void {
  const peer = args.includes('--no-peer') ? null : runPeer();
  if (peer) assertSameAnswers(peer);
  const lines = measure(peer);
  if (args.includes('--json')) process.stdout.write(`${JSON.stringify(lines, null, 1)}\n`);
  else show(lines, peer);
}

main(process.argv.slice(2));
