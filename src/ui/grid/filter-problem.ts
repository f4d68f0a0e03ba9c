import { typedNumber } from '@/src/ui/run-number';

/** Why a pair of limits cannot be used, or null. An empty limit is no limit. */
export function rangeProblem(low: string, high: string): string | null {
  const [from, to] = [typedNumber(low), typedNumber(high)];
  if (from === undefined || to === undefined) return 'Write numbers such as 0.5 or 2e-3.';
  if (from !== null && to !== null && from > to) return 'The lower limit is above the upper one.';
  return null;
}
