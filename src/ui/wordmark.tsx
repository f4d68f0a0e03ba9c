/** The chaff line: grain stays below it, specks drift off above. */
export function Wordmark() {
  return (
    <span className="inline-flex items-center gap-2 font-serif text-xl font-medium tracking-tight">
      <svg viewBox="0 0 34 24" className="h-6 w-8 shrink-0" aria-hidden="true" fill="none">
        <path d="M1 20 L33 9" stroke="currentColor" strokeWidth="1.4" />
        <g className="text-chaff" fill="currentColor">
          <circle cx="11" cy="11.5" r="1.9" />
          <circle cx="18.5" cy="7" r="1.45" />
          <circle cx="25" cy="3.6" r="1" />
          <circle cx="30.5" cy="1.8" r="0.7" />
        </g>
        <circle cx="7" cy="21.5" r="1.6" fill="currentColor" />
        <circle cx="14" cy="20.5" r="2.3" fill="currentColor" />
        <circle cx="23" cy="18.5" r="3.1" fill="currentColor" />
      </svg>
      Chaffline
    </span>
  );
}
