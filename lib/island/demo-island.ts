/**
 * The demo's island, drawn by this project: coast, towns, roads and streets. Nothing of it exists; it lies
 * in open water. Latitudes and longitudes in degrees, WGS 84.
 */
export type Place = { latitude: number; longitude: number };

export const islandName = 'Hallow Island';
export const countyName = 'Fold County';

const at = (latitude: number, longitude: number): Place => ({ latitude, longitude });

/** Clockwise from the north cape. */
export const coast: Place[] = [
  at(41.372, -58.31),
  at(41.364, -58.262),
  at(41.341, -58.221),
  at(41.318, -58.19),
  at(41.287, -58.172),
  at(41.252, -58.181),
  at(41.229, -58.207),
  at(41.211, -58.246),
  at(41.198, -58.291),
  at(41.206, -58.338),
  at(41.222, -58.371),
  at(41.214, -58.402),
  at(41.231, -58.438),
  at(41.262, -58.452),
  at(41.291, -58.441),
  at(41.302, -58.405),
  at(41.327, -58.394),
  at(41.349, -58.361),
];

export const towns = {
  'Juniper Bend': at(41.284, -58.312),
  'Upper Fold': at(41.339, -58.301),
  Gannet: at(41.322, -58.232),
  Saltmarsh: at(41.243, -58.232),
  Quayside: at(41.217, -58.312),
  Heronsgate: at(41.262, -58.403),
  'Mill Cross': at(41.301, -58.368),
} satisfies Record<string, Place>;
export type Town = keyof typeof towns;

/** Road junctions between the towns. */
export const junctions = {
  ridge: at(41.311, -58.306),
  ferry: at(41.301, -58.25),
  dyke: at(41.259, -58.268),
  sluice: at(41.239, -58.318),
  heath: at(41.274, -58.358),
} satisfies Record<string, Place>;

type Node = Town | keyof typeof junctions;

/** Both ways; the speed says whether it is a lane or the island road. */
export const roads: { from: Node; to: Node; kmPerHour: number }[] = [
  { from: 'Juniper Bend', to: 'ridge', kmPerHour: 60 },
  { from: 'ridge', to: 'Upper Fold', kmPerHour: 50 },
  { from: 'Juniper Bend', to: 'ferry', kmPerHour: 60 },
  { from: 'ferry', to: 'Gannet', kmPerHour: 50 },
  { from: 'ridge', to: 'Gannet', kmPerHour: 40 },
  { from: 'Juniper Bend', to: 'dyke', kmPerHour: 60 },
  { from: 'dyke', to: 'Saltmarsh', kmPerHour: 50 },
  { from: 'dyke', to: 'sluice', kmPerHour: 40 },
  { from: 'sluice', to: 'Quayside', kmPerHour: 50 },
  { from: 'Juniper Bend', to: 'sluice', kmPerHour: 60 },
  { from: 'Juniper Bend', to: 'heath', kmPerHour: 60 },
  { from: 'heath', to: 'Heronsgate', kmPerHour: 60 },
  { from: 'heath', to: 'Mill Cross', kmPerHour: 50 },
  { from: 'Mill Cross', to: 'ridge', kmPerHour: 40 },
  { from: 'Heronsgate', to: 'sluice', kmPerHour: 40 },
  { from: 'ferry', to: 'Saltmarsh', kmPerHour: 40 },
];

/** Streets, each beside its town by an offset in thousandths of a degree. */
export const streets: { name: string; town: Town; north: number; east: number }[] = [
  { name: 'Quay Rise', town: 'Quayside', north: 3, east: 4 },
  { name: 'Salt Row', town: 'Saltmarsh', north: 2, east: -3 },
  { name: 'Mill Lane', town: 'Mill Cross', north: -4, east: 2 },
  { name: 'Heron Court', town: 'Heronsgate', north: 4, east: 5 },
  { name: 'Tern Street', town: 'Gannet', north: -3, east: 3 },
  { name: 'Kiln Yard', town: 'Juniper Bend', north: 3, east: -5 },
  { name: 'Gannet Way', town: 'Gannet', north: 4, east: -4 },
  { name: 'Orchard End', town: 'Upper Fold', north: 3, east: 3 },
  { name: 'Bell Steps', town: 'Quayside', north: -2, east: -4 },
  { name: 'Sluice House Road', town: 'Quayside', north: 6, east: -6 },
  { name: 'Fold Hill', town: 'Upper Fold', north: -4, east: -5 },
  { name: 'Lantern Walk', town: 'Juniper Bend', north: -4, east: 4 },
  { name: 'Ropewalk', town: 'Saltmarsh', north: -3, east: 4 },
  { name: 'Dyke Road', town: 'Saltmarsh', north: 6, east: -8 },
  { name: 'Chapel Rise', town: 'Mill Cross', north: 4, east: -3 },
  { name: 'Reedbank', town: 'Heronsgate', north: -4, east: 3 },
];

/** Where a house stands, by its street and number; near enough for a drive time. */
export function addressPlace(streetName: string, houseNumber: number): Place & { town: Town } {
  const street = streets.find(({ name }) => name === streetName);
  if (!street) throw new Error(`no such street on the island: ${streetName}`);
  const town = towns[street.town];
  return {
    town: street.town,
    latitude: round(town.latitude + (street.north + houseNumber * 0.08) / 1000),
    longitude: round(town.longitude + (street.east + houseNumber * 0.05) / 1000),
  };
}

const round = (degrees: number) => Math.round(degrees * 1e5) / 1e5;
