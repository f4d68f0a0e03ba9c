const [firstMs, mostMs, steadyMs] = [200, 5_000, 30_000];

/** How long to wait before the next start: longer each time, from the beginning again after a steady life. */
export function nextPauseMs(lastPauseMs, lifeMs) {
  if (lastPauseMs === undefined || lifeMs >= steadyMs) return firstMs;
  return Math.min(lastPauseMs * 2, mostMs);
}
