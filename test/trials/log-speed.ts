/**
 * How long a log of a million rows takes to read, against csv-parse alone on the same bytes, and how much memory: `npx tsx test/trials/log-speed.ts`.
 * CPU seconds of this process (user), so that other work on the machine counts little; best of three. Output of the last run: fixtures/log-speed.txt
 */
import { once } from 'node:events';
import { parse } from 'csv-parse';
import { seeded } from '../../pipeline/numerics/random.ts';
import { quantityOf } from '../../pipeline/quantities/vocabulary.ts';
import { readLog } from '../../pipeline/trials/log-table.ts';
import { readSeries } from '../../pipeline/trials/series.ts';

const place = { file: 'study.yaml' };
const channels = Array.from({ length: 8 }, (_, k) => `T${k}`);

/** A log as it would come from a disk, made up piece by piece. */
function* pieces(rows: number): Generator<Buffer> {
  const random = seeded(1);
  yield Buffer.from(`t [s],run,${channels.map((name) => `${name} [degC]`).join(',')}\n`);
  for (let i = 0; i < rows; i += 1000) {
    const lines = Array.from(
      { length: 1000 },
      (_, k) => `${i + k},R${i},${channels.map(() => (20 + 5 * random.uniform()).toFixed(3)).join(',')}\n`,
    );
    yield Buffer.from(lines.join(''));
  }
}

async function alone(log: Iterable<Buffer>): Promise<void> {
  const parser = parse({ record_delimiter: '\n' });
  parser.resume();
  const ended = once(parser, 'end');
  for (const piece of log) if (!parser.write(piece)) await once(parser, 'drain');
  parser.end();
  await ended;
}

const time = { column: 't', place };
const column = (name: string) => ({ column: name, place, quantity: quantityOf('temperature')! });
const jobs: Readonly<Record<string, (log: Iterable<Buffer>) => Promise<unknown>>> = {
  'csv-parse alone': alone,
  'curves of 1,000 trials': (log) =>
    readSeries(
      { file: 'log.csv', pieces: log },
      { name: '', trial: { column: 'run', place }, time, value: column('T3'), missing: ['NA', '-9999'] },
    ),
  'all columns in SI': (log) =>
    readLog(
      { file: 'log.csv', pieces: log },
      { time, columns: channels.map((name) => ({ key: name, ...column(name) })), missing: ['NA', '-9999'] },
    ),
};

/** Most memory in use while the log is made and read piece by piece, above what was in use before, MB. */
async function memoryOf(rows: number, job: (log: Iterable<Buffer>) => Promise<unknown>): Promise<number> {
  const before = process.memoryUsage().rss;
  let peak = before;
  function* watched(): Generator<Buffer> {
    for (const piece of pieces(rows)) {
      peak = Math.max(peak, process.memoryUsage().rss);
      yield piece;
    }
  }
  await job(watched());
  return (peak - before) / 1e6;
}

export interface LogSpeed {
  readonly job: string;
  /** CPU seconds, best of three. */
  readonly seconds: number;
  readonly megabytes: number;
}

/** csv-parse alone first, then ours. */
export async function measure(rows: number): Promise<readonly LogSpeed[]> {
  const megabytes = new Map<string, number>();
  for (const [name, job] of Object.entries(jobs)) megabytes.set(name, await memoryOf(rows, job));
  const log = [...pieces(rows)];
  const measured: LogSpeed[] = [];
  for (const [name, job] of Object.entries(jobs)) {
    let seconds = Number.POSITIVE_INFINITY;
    for (let run = 0; run < 3; run++) {
      const begin = process.cpuUsage();
      await job(log);
      seconds = Math.min(seconds, process.cpuUsage(begin).user / 1e6);
    }
    measured.push({ job: name, seconds, megabytes: megabytes.get(name)! });
  }
  return measured;
}

if (process.argv[1]?.endsWith('log-speed.ts')) {
  const rows = Number(process.argv[2] ?? 1_000_000);
  console.log(`${rows} rows of 10 columns, node ${process.version}`);
  const measured = await measure(rows);
  for (const { job, seconds, megabytes } of measured)
    console.log(
      `${job.padEnd(24)} ${seconds.toFixed(2)} s CPU, ${(seconds / measured[0]!.seconds).toFixed(2)} x; memory up by ${megabytes.toFixed(0)} MB`,
    );
}
