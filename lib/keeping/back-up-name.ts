const shape = /^setwell-(\d{4}-\d\d-\d\d)T(\d\d)-(\d\d)-(\d\d)Z\.tar\.gz$/;

/** The file of a copy of the database, named for the second (UTC) at which it was taken. */
export function backUpName(takenAt: Date): string {
  const second = takenAt.toISOString().slice(0, 19).replaceAll(':', '-');
  return `setwell-${second}Z.tar.gz`;
}

/** When a copy was taken by its name; null for any other file. */
export function backUpTakenAt(name: string): Date | null {
  const [, day, hours, minutes, seconds] = shape.exec(name) ?? [];
  if (!day) return null;
  const taken = new Date(`${day}T${hours}:${minutes}:${seconds}Z`);
  return Number.isNaN(taken.getTime()) ? null : taken;
}
