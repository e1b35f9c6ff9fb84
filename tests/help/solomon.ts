import { readFileSync } from 'node:fs';
import { gunzipSync } from 'node:zlib';
import type { PlanDaysInput } from '@/lib/schedule/routes/plan-days';
import optima from '../reference/data/solomon-optima.json';

type Instance = { vehicles: number; capacity: number; rows: number[][] };

const file = new URL('../reference/data/solomon.json.gz', import.meta.url);
const { instances } = JSON.parse(gunzipSync(readFileSync(file)).toString()) as {
  instances: Record<string, Instance>;
};

export const solomonNames = Object.keys(instances);
export type SolomonSize = 25 | 50 | 100;

/** The published optimum, with each arc cut to one decimal. */
export function solomonOptimum(name: string, size: SolomonSize): number {
  const found = (optima.optima as Record<string, Record<string, number>>)[name]?.[size];
  if (found === undefined) throw new Error(`no optimum of ${name} with ${size}`);
  return found;
}

/** A published instance as a day to plan: distances are minutes, each cut to one decimal. */
export function solomonDay(
  name: string,
  size: SolomonSize,
): Pick<PlanDaysInput, 'stops' | 'crews' | 'driveMinutes'> {
  const instance = instances[name];
  if (!instance) throw new Error(`no instance ${name}`);
  const rows = instance.rows.slice(0, size + 1) as [
    number,
    number,
    number,
    number,
    number,
    number,
  ][];
  const [depot] = rows;
  if (!depot) throw new Error(`${name} has no depot`);
  const cut = (distance: number) => Math.floor(distance * 10 + 1e-9) / 10;
  return {
    driveMinutes: rows.map(([x1, y1]) => rows.map(([x2, y2]) => cut(Math.hypot(x1 - x2, y1 - y2)))),
    stops: rows.slice(1).map(([, , load, earliest, latest, workMinutes], index) => ({
      id: `${index + 1}`,
      place: index + 1,
      load,
      earliest,
      latest,
      workMinutes,
    })),
    crews: Array.from({ length: instance.vehicles }, (_, index) => ({
      id: `crew ${index}`,
      startPlace: 0,
      endPlace: 0,
      leavesAt: depot[3],
      homeBy: depot[4],
      capacity: instance.capacity,
    })),
  };
}

/** Every promise kept, every stop once; the driving added up anew. Throws with what is wrong. */
export function checkedDriving(
  day: Pick<PlanDaysInput, 'stops' | 'crews' | 'driveMinutes'>,
  routes: readonly { crewId: string; stops: readonly { id: string; arrivesAt: number }[] }[],
): number {
  const seen = new Set<string>();
  let driven = 0;
  const minutes = (from: number, to: number) => day.driveMinutes[from]?.[to] ?? Number.NaN;
  for (const route of routes) {
    const crew = day.crews.find(({ id }) => id === route.crewId);
    if (!crew) throw new Error(`no crew ${route.crewId}`);
    if (route.stops.length === 0) continue;
    let [at, time, load] = [crew.startPlace, crew.leavesAt, 0];
    for (const { id, arrivesAt } of route.stops) {
      const stop = day.stops.find((candidate) => candidate.id === id);
      if (!stop || seen.has(id)) throw new Error(`stop ${id} is unknown or twice`);
      seen.add(id);
      const readyAt = time + minutes(at, stop.place);
      const isKept =
        arrivesAt >= readyAt - 1e-9 && arrivesAt >= stop.earliest && arrivesAt <= stop.latest;
      if (!isKept) throw new Error(`stop ${id} is reached at ${readyAt}, planned ${arrivesAt}`);
      driven += minutes(at, stop.place);
      time = arrivesAt + stop.workMinutes;
      load += stop.load ?? 0;
      at = stop.place;
    }
    driven += minutes(at, crew.endPlace);
    if (time + minutes(at, crew.endPlace) > crew.homeBy + 1e-9) throw new Error('home too late');
    if (load > (crew.capacity ?? Number.POSITIVE_INFINITY)) throw new Error('too much load');
  }
  if (seen.size !== day.stops.length) throw new Error(`${day.stops.length - seen.size} left out`);
  return driven;
}
