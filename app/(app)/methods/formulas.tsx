import type { ReactNode } from 'react';
import { IndexedText } from '@/src/ui/lowered-text';

type Method = { name: string; formula: ReactNode; says: string; source: string };

const methods: Method[] = [
  {
    name: 'Beta',
    formula: (
      <>
        β = 3 L ⟨Q<sub>pr</sub>⟩ / (16 π GM c ρ s)
      </>
    ),
    says: 'Radiation pressure over gravity of a sphere of radius s and density ρ; independent of the distance.',
    source: 'Burns, Lamy & Soter (1979), Icarus 40, 1',
  },
  {
    name: 'Efficiency of one sphere',
    formula: (
      <>
        Q<sub>pr</sub> = Q<sub>ext</sub> − g Q<sub>sca</sub>
      </>
    ),
    says: 'From the Mie series with the complex refractive index at each wavelength; relative accuracy 10⁻⁹ for size parameters up to 2000.',
    source: 'Bohren & Huffman (1983), chapter 4',
  },
  {
    name: 'Mean over the spectrum',
    formula: (
      <>
        ⟨Q<sub>pr</sub>⟩ = ∫ Q<sub>pr</sub> F<sub>λ</sub> dλ / ∫ F<sub>λ</sub> dλ
      </>
    ),
    says: 'On nested wavelength grids until two differences have fallen below the tolerance: 10⁻⁴ for absorbing materials, 10⁻³ for transparent ones, where narrow resonances set the limit.',
    source: 'Trapezoid rule in a smooth variable; error bound kept with every curve',
  },
  {
    name: 'Release',
    formula: (
      <>
        β<sub>c</sub> = r / 2a = (1 − e²) / (2 (1 + e cos f))
      </>
    ),
    says: 'A grain let go without relative speed leaves when β ≥ β_c; equality counts. With a parent that feels light itself: 1 − (1 − β_p)(1 − r/2a).',
    source: 'Energy balance at release',
  },
  {
    name: 'Unbound radii',
    formula: (
      <>
        {'{'} s : β(s) ≥ β<sub>c</sub> {'}'}
      </>
    ),
    says: 'All crossings, found on 640 radii from 1 nm to 1 cm with every bend refined: none, one, a window, or several.',
    source: 'Brent (1973), chapter 4, in ln s to 10⁻⁹',
  },
  {
    name: 'Orbit after release',
    formula: <>a′ = a (1 − β) / (1 − 2aβ/r)</>,
    says: 'In the weakened gravity, with the eccentricity, the turn of the pericentre, and the speed far away of what leaves.',
    source: 'Two-body mechanics',
  },
  {
    name: 'Drag time',
    formula: (
      <>
        t = a² c / (4 β GM) · (1 − e²)<sup>3/2</sup> ₂F₁(3/10, 1; 9/5; e²)
      </>
    ),
    says: 'Poynting-Robertson time from the orbit after release down to the star; divided by 1 + the wind-to-light drag ratio when a wind is given.',
    source: 'Wyatt & Whipple (1950), ApJ 111, 134',
  },
  {
    name: 'Collision time',
    formula: <>t = P / (4 π τ)</>,
    says: 'In a disc of face-on optical depth τ: an order of magnitude.',
    source: 'Wyatt et al. (1999), ApJ 527, 918; Wyatt (2005), A&A 433, 1007',
  },
  {
    name: 'Temperature',
    formula: (
      <>
        ⟨Q<sub>abs</sub>⟩<sub>★</sub> L / (16 π r² σ) = ⟨Q<sub>abs</sub>⟩(T) T⁴
      </>
    ),
    says: 'Absorbed starlight equals thermal emission; 0.2 % of the model. With constant Q_pr the grain is a black body.',
    source: 'Bohren & Huffman (1983), section 4.7',
  },
  {
    name: 'Porous and coated grains',
    formula: (
      <>
        Σ f<sub>i</sub> (ε<sub>i</sub> − ε) / (ε<sub>i</sub> + 2ε) = 0
      </>
    ),
    says: 'Bruggeman (or Maxwell Garnett with the solid as the matrix) for voids; concentric spheres for a mantle. Mixing rules differ among each other by 10 to 30 %.',
    source: 'Bohren & Huffman (1983), sections 8.1 and 8.5; Yang (2003), Appl. Opt. 42, 1710',
  },
  {
    name: 'P(unbound)',
    formula: <>P = ∫ p(ln s) P(ρ ≤ f(s)) d ln s</>,
    says: 'Radius lognormal about its value as the median, density normal above zero, independent; deterministic quadrature, error below 10⁻⁵.',
    source: 'σ of ln s = √ln(1 + (σ_s/s)²)',
  },
  {
    name: '95 % interval of a share',
    formula: <>Wilson (1927), n = (Σw)² / Σw²</>,
    says: 'How far the share could lie from that of the population the rows were drawn from; rows count as independent draws.',
    source: 'Wilson (1927), J. Am. Stat. Assoc. 22, 209',
  },
];

export function Formulas() {
  return (
    <dl className="grid gap-6">
      {methods.map(({ name, formula, says, source }) => (
        <div
          key={name}
          className="border-line grid gap-x-8 gap-y-1 border-t pt-4 first:border-t-0 first:pt-0 md:grid-cols-[12rem_minmax(0,1fr)]"
        >
          <dt className="font-medium">{name}</dt>
          <dd className="min-w-0">
            <p className="font-serif text-lg">{formula}</p>
            <p className="mt-1 max-w-prose">
              <IndexedText text={says} />
            </p>
            <p className="text-muted mt-1 text-sm">
              <IndexedText text={source} />
            </p>
          </dd>
        </div>
      ))}
    </dl>
  );
}
