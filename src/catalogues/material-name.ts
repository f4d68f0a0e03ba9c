const plain = (name: string) => name.trim().toLowerCase();
const joined = (name: string) => name.replace(/[\s-]+/g, '_');

/** Slug of a name or alias, or null. */
export function findMaterial(name: string, known: ReadonlyMap<string, string>): string | null {
  const asWritten = plain(name);
  return known.get(asWritten) ?? known.get(joined(asWritten)) ?? null;
}

/** Up to three known names that look most like the unknown one. */
export function nearestNames(name: string, known: ReadonlyMap<string, string>): string[] {
  const wanted = joined(plain(name)).slice(0, 40);
  return [...known.keys()]
    .map((candidate) => ({ candidate, distance: likeness(wanted, candidate) }))
    .filter(({ candidate, distance }) => distance <= Math.max(2, Math.ceil(candidate.length / 3)))
    .sort((a, b) => a.distance - b.distance || a.candidate.localeCompare(b.candidate, 'en'))
    .slice(0, 3)
    .map(({ candidate }) => candidate);
}

export function unknownMaterialReason(known: ReadonlyMap<string, string>, name: string): string {
  const near = nearestNames(name, known);
  const slugs = [...new Set(known.values())].sort();
  return near.length > 0
    ? `is not a known material; nearest: ${near.join(', ')}`
    : `is not a known material; known: ${slugs.slice(0, 12).join(', ')}${slugs.length > 12 ? ' ...' : ''}`;
}

const likeness = (wanted: string, candidate: string): number =>
  candidate.startsWith(wanted) && wanted.length >= 3 ? 0 : editDistance(wanted, candidate);

/** Levenshtein (1966): least number of letters inserted, dropped or changed. */
function editDistance(a: string, b: string): number {
  let previous = Array.from({ length: b.length + 1 }, (_, j) => j);
  for (let i = 1; i <= a.length; i++) {
    const current = [i];
    for (let j = 1; j <= b.length; j++)
      current[j] = Math.min(previous[j] + 1, current[j - 1] + 1, previous[j - 1] + (a[i - 1] === b[j - 1] ? 0 : 1));
    previous = current;
  }
  return previous[b.length];
}
