export function PlotSkeleton() {
  return (
    <div className="flex h-full w-full animate-pulse items-end gap-2 p-8 motion-reduce:animate-none" aria-hidden="true">
      {['h-1/4', 'h-1/2', 'h-3/4', 'h-2/3', 'h-2/5', 'h-1/5', 'h-1/6'].map((height) => (
        <div key={height} className={`bg-line/60 flex-1 rounded-sm ${height}`} />
      ))}
    </div>
  );
}
