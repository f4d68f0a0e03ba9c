/** Share done, 0 to 1. A native element: its width needs no style attribute. */
export function ProgressBar({ value, label }: { value: number; label: string }) {
  return <progress value={value} max={1} aria-label={label} className="progress-bar block h-2.5 w-full" />;
}
