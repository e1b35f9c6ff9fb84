/** What the map of a day shows: each crew's way, from its base by its stops and home. */
export type MapPlace = { lat: number; lon: number };

export type MapStop = {
  visitId: string;
  place: MapPlace;
  /** Its number in the order of the day. */
  number: number;
  /** "2. Isa Okafor, 18 Mill Lane, 8:00-10:00 AM". */
  label: string;
};

export type MapCrew = {
  crewId: string;
  name: string;
  /** As CSS takes it. */
  colour: string;
  base: MapPlace | null;
  stops: MapStop[];
  /** Along the roads where they are known. */
  line: MapPlace[];
};

/** Where the tiles come from; null draws the project's own island. */
export type MapGround = { tilesUrl: string; attribution: string } | null;
