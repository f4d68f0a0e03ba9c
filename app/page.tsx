import { redirect } from 'next/navigation';
import { LinkButton } from '@/src/ui/link-button';
import { ThemeSwitch } from '@/src/ui/theme-switch';
import { WinnowingFigure } from '@/src/ui/winnowing-figure';
import { Wordmark } from '@/src/ui/wordmark';
import { optionalActor } from '@/src/web/page';
import { DemoAnswer } from './demo-answer';

const promises = [
  [
    'Real optics',
    'Mie theory with measured optical constants, averaged over the star’s light, with an error bound on every curve.',
  ],
  [
    'All the radii',
    'None, one, or a window: every size at which beta crosses the critical value is found, and “never” is an answer.',
  ],
  ['How sure', 'Errors of size and density become a probability for each grain and an interval for the population.'],
  [
    'On record',
    'A run keeps every input by value and a digest of its results: anyone in the group can compute the same bits again.',
  ],
];

export default async function FrontPage() {
  if (await optionalActor()) redirect('/home');
  return (
    <div className="mx-auto max-w-6xl px-5 sm:px-8">
      <header className="flex items-center justify-between py-5">
        <Wordmark />
        <div className="flex items-center gap-2">
          <ThemeSwitch />
          <LinkButton href="/sign-in" size="small">
            Sign in
          </LinkButton>
        </div>
      </header>
      <main id="content" className="grid gap-14 py-8">
        <div className="grid items-center gap-10 lg:grid-cols-[minmax(0,5fr)_minmax(0,4fr)]">
          <div className="grid gap-6">
            <h1 className="text-4xl leading-tight font-medium tracking-tight sm:text-5xl">
              Which grains does starlight blow out?
            </h1>
            <p className="text-muted max-w-prose text-lg">
              Upload a catalogue of dust grains, choose a star and the orbit they are released from, and learn which of
              them radiation pressure removes: beta of every grain, the critical radii of every material, the share of
              the population that is lost, and how sure that is.
            </p>
            <div className="flex flex-wrap gap-3">
              <LinkButton href="/sign-in" variant="primary">
                Sign in
              </LinkButton>
              <LinkButton href="/sign-up">Sign up and start a group</LinkButton>
            </div>
          </div>
          <WinnowingFigure />
        </div>
        <DemoAnswer />
        <dl className="grid gap-8 sm:grid-cols-2 lg:grid-cols-4">
          {promises.map(([term, says]) => (
            <div key={term} className="border-chaff border-t-2 pt-3">
              <dt className="font-serif text-xl">{term}</dt>
              <dd className="text-muted mt-2">{says}</dd>
            </div>
          ))}
        </dl>
      </main>
      <footer className="border-line text-muted border-t py-6 text-sm">
        Research estimates for idealised grains, not a spacecraft impact-hazard assessment.
      </footer>
    </div>
  );
}
