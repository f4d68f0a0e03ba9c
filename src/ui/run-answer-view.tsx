import type { RunSummary } from '@/entities/run-summary';
import type { RunItem } from '@/src/runs/schema';
import { runAnswer, type AnswerPart } from './run-answer';
import { inputsOf, starInWords } from './run-inputs-of';

/** The answer first: one sentence for the population, one for each material. */
export function RunAnswer({ run, summary }: { run: RunItem; summary: RunSummary }) {
  const answer = runAnswer(summary, starInWords(inputsOf(run).star));
  return (
    <section aria-labelledby="answer" className="border-chaff border-l-4 py-1 pl-5 sm:pl-7">
      <h2 id="answer" className="sr-only">
        The answer
      </h2>
      <p className="max-w-4xl font-serif text-2xl leading-snug text-balance sm:text-3xl">{answer.headline.map(part)}</p>
      <p className="text-muted mt-5 text-sm" id="unbound-radii">
        Unbound radii
      </p>
      <ul className="mt-1 grid gap-1.5" aria-labelledby="unbound-radii">
        {answer.materials.map(({ material, text, geometric }) => (
          <li key={material} className="flex flex-wrap items-baseline gap-x-3">
            <span className="font-serif text-lg">{text}</span>
            <span className="text-muted text-sm">{geometric}</span>
          </li>
        ))}
      </ul>
      <div className="text-muted mt-4 grid max-w-prose gap-1 text-sm">
        <p>{answer.comparison}</p>
        {answer.notes.map((note) => (
          <p key={note}>{note}</p>
        ))}
      </div>
    </section>
  );
}

const part = (piece: AnswerPart, index: number) =>
  typeof piece === 'string' ? (
    piece
  ) : (
    <strong key={index} className={`whitespace-nowrap ${piece.isMinor ? 'font-normal' : 'font-semibold'}`}>
      {piece.figure}
    </strong>
  );
