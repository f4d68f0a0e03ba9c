'use client';

import { useMemo } from 'react';
import type { CurveAnswer } from '@/src/runs/schema';
import { BetaCurvePlot } from '@/src/ui/plots/beta-curve';
import { RadiusRangeControl } from '@/src/ui/plots/radius-range-control';
import { rangeAround } from '@/src/ui/plots/radius-range';
import { useRadiusRange } from '@/src/ui/plots/use-radius-range';
import { intervalsInWords } from '@/src/ui/run-answer';
import { exactText, percentText, radiusText, trimmed } from '@/src/ui/run-figures';

const warnAboveShare = 0.01;

export function CalculatorAnswer({ answer, name }: { answer: CurveAnswer; name: string }) {
  const curves = useMemo(() => [{ name, ...answer }], [name, answer]);
  const whole = useMemo(() => rangeAround(radiiToSee(answer)), [answer]);
  const { rangeUm, isZoomed, choose, zoom } = useRadiusRange(whole);
  return (
    <>
      <div className="border-chaff border-l-4 pl-5" role="status">
        <p className="font-serif text-2xl leading-snug sm:text-3xl">{sentenceOf(answer, name)}</p>
        <p className="text-muted mt-1">
          With Q_pr = 1 it would be unbound below {radiusText(answer.geometricBlowoutRadiusUm)}.
        </p>
      </div>
      <Numbers answer={answer} />
      {answer.shareOutsideValidRange > warnAboveShare && (
        <p className="text-sm">
          <strong>Bear in mind:</strong> {percentText(answer.shareOutsideValidRange)} of the starlight lies outside the
          wavelengths at which the optical constants were measured.
        </p>
      )}
      {answer.notes.map((note) => (
        <p key={note} className="text-muted text-sm">
          {note}
        </p>
      ))}
      <RadiusRangeControl rangeUm={rangeUm} isZoomed={isZoomed} onChoose={choose} />
      <BetaCurvePlot
        curves={curves}
        betaCritical={answer.betaCritical}
        rangeUm={rangeUm}
        fileName="beta"
        height="h-96"
        onZoomX={zoom}
        caption={`${name} at ${exactText(answer.densityGCm3, 4)} g/cm³. At or above the dashed line a grain is unbound.`}
      />
    </>
  );
}

function sentenceOf({ unboundIntervalsUm, betaMax, radiusAtBetaMaxUm }: CurveAnswer, name: string): string {
  if (unboundIntervalsUm.length > 0) return `${name} is unbound ${intervalsInWords(unboundIntervalsUm)}.`;
  return `${name} is never unbound: beta peaks at ${trimmed(betaMax)} at ${radiusText(radiusAtBetaMaxUm)}.`;
}

function Numbers({ answer }: { answer: CurveAnswer }) {
  const figures = [
    ['Highest beta', trimmed(answer.betaMax, 4)],
    ['at radius', `${trimmed(answer.radiusAtBetaMaxUm, 4)} µm`],
    ['Critical beta', exactText(answer.betaCritical, 4)],
    ['Error bound of beta', percentText(answer.relativeErrorBound)],
    ['Starlight outside the measured band', percentText(answer.shareOutsideValidRange)],
  ];
  return (
    <dl className="flex flex-wrap gap-x-8 gap-y-3">
      {figures.map(([term, value]) => (
        <div key={term}>
          <dt className="text-muted text-sm">{term}</dt>
          <dd className="font-mono text-lg tabular-nums">{value}</dd>
        </div>
      ))}
    </dl>
  );
}

/** The ends of the window and the peak, and at least from 0.02 to 50 um. */
const radiiToSee = ({ unboundIntervalsUm, radiusAtBetaMaxUm }: CurveAnswer) =>
  [...unboundIntervalsUm.flat(), radiusAtBetaMaxUm, 0.02, 50].filter((radius): radius is number => radius !== null);
