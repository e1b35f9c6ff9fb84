/** A row or column of face offsets along one line: `atMm` along it, `sMm` proud of the reference. */
export type ProfilePoint = { id: string; atMm: number; sMm: number; u: number };
