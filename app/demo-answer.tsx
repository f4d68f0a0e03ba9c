import { demo } from '@/fixtures/demo';
import { env } from '@/src/env';
import { Refusal } from '@/src/errors';
import { actorOfEmail } from '@/src/people/actor-of-email';
import { listRuns } from '@/src/runs/find-runs';
import { runAnswer } from '@/src/ui/run-answer';
import { inputsOf, starInWords } from '@/src/ui/run-inputs-of';
import { pageEm } from '@/src/web/page';

const searchedRuns = 100;

/** What the run of the demonstration found, on installations that have one. */
export async function DemoAnswer() {
  if (env().CHAFFLINE_DEMO !== '1') return null;
  const run = await demoRun();
  if (!run?.summary) return null;
  const { headline, materials } = runAnswer(run.summary, starInWords(inputsOf(run).star));
  return (
    <section aria-labelledby="example" className="border-chaff grid gap-3 border-l-4 py-1 pl-5 sm:pl-7">
      <h2 id="example" className="text-muted font-sans text-sm">
        An example: invented grains, released on a circular orbit
      </h2>
      <p className="max-w-4xl font-serif text-2xl leading-snug text-balance">
        {headline.map((part, place) =>
          typeof part === 'string' ? (
            part
          ) : (
            <span key={place} className="whitespace-nowrap">
              {part.figure}
            </span>
          ),
        )}
      </p>
      <ul className="grid gap-1 font-serif text-lg" aria-label="Unbound radii">
        {materials.map(({ material, text }) => (
          <li key={material}>{text}</li>
        ))}
      </ul>
    </section>
  );
}

async function demoRun() {
  const em = await pageEm();
  const actor = await actorOfEmail(em, demo.people.demoResearcher.email).catch(nobodyYet);
  if (!actor) return undefined;
  const { items } = await listRuns(em, actor, { limit: searchedRuns });
  return items.findLast(({ name, status }) => name === demo.catalogues[0].run && status === 'done');
}

/** The page may be asked for before the demonstration is in place. */
function nobodyYet(error: unknown): null {
  if (error instanceof Refusal && error.kind === 'notFound') return null;
  throw error;
}
