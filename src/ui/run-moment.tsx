/** A moment in UTC, the same on server and screen. */
export function Moment({ iso }: { iso: string }) {
  return (
    <time dateTime={iso} className="whitespace-nowrap tabular-nums">
      {`${iso.slice(0, 10)} ${iso.slice(11, 16)} UTC`}
    </time>
  );
}
