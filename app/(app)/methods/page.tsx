import type { Metadata } from 'next';
import { ENGINE_VERSION } from '@/src/physics/engine-version';
import { IndexedText } from '@/src/ui/lowered-text';
import { PageHeader } from '@/src/ui/page-header';
import { RunSection } from '@/src/ui/run-section';
import { cautions } from './cautions';
import { Constants } from './constants';
import { Formulas } from './formulas';

export const metadata: Metadata = { title: 'Methods' };

export default function MethodsPage() {
  return (
    <>
      <PageHeader
        title="Methods"
        subtitle={`What is computed, from which sources, and how far to trust it. Engine version ${ENGINE_VERSION}.`}
      />
      <div className="grid gap-12">
        <RunSection id="formulas" title="What is computed">
          <Formulas />
        </RunSection>
        <RunSection id="cautions" title="What to bear in mind">
          <ol className="grid max-w-3xl list-decimal gap-2 pl-6">
            {cautions.map((caution) => (
              <li key={caution}>
                <IndexedText text={caution} />
              </li>
            ))}
          </ol>
        </RunSection>
        <RunSection id="constants" title="Constants">
          <Constants />
        </RunSection>
      </div>
    </>
  );
}
