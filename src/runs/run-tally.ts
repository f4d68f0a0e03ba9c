import type { FateBins, MaterialSummary, RunHistograms, RunSummary } from '@/entities/run-summary';
import { betaOf } from '@/src/physics/beta';
import { isRepelled, isUnbound } from '@/src/physics/fate';
import { histogramEdgesM } from '@/src/physics/histogram';
import { effectiveRows, wilsonInterval } from '@/src/physics/wilson';
import { micrometres } from '@/src/catalogues/shown-units';
import type { GrainChunk } from './grain-chunk';
import type { GrainResults } from './grain-results';
import { materialSummary } from './material-summary';
import type { PreparedRun } from './prepare-run';
import { runWarnings } from './run-warnings';
import type { SizeSpread } from './size-spread';

const weightings = ['number', 'area', 'mass'] as const;
type Shares = Record<(typeof weightings)[number], number>;
const none = (): Shares => ({ number: 0, area: 0, mass: 0 });
const sphere = (4 / 3) * Math.PI;

/** Adds up what the grains say of the population, chunk by chunk. */
export class RunTally {
  private rows = 0;
  private unboundRows = 0;
  private repelled = 0;
  private expected = 0;
  private squaredCounts = 0;
  private readonly total = none();
  private readonly unbound = none();
  private readonly geometric = none();
  private readonly perMaterial = new Map<string, { count: number; unbound: number }>();
  private readonly edgesM: number[];
  private readonly bins: Record<keyof Shares, FateBins>;

  constructor(
    private readonly prepared: PreparedRun,
    spread: SizeSpread,
  ) {
    this.edgesM = histogramEdgesM(spread);
    const empty = () => new Array<number>(this.edgesM.length - 1).fill(0);
    const fates = (): FateBins => ({ unbound: empty(), bound: empty() });
    this.bins = { number: fates(), area: fates(), mass: fates() };
  }

  add(chunk: GrainChunk, results: GrainResults): void {
    const { star, betaCritical } = this.prepared.inputs;
    for (let row = 0; row < chunk.length; row += 1) {
      const radiusM = chunk.radiusM[row];
      const densityKgM3 = chunk.densityKgM3[row];
      const count = chunk.count[row];
      const area = count * Math.PI * radiusM * radiusM;
      const weights: Shares = { number: count, area, mass: count * sphere * radiusM ** 3 * densityKgM3 };
      const unbound = results.isUnbound[row] === 1;
      const geometricBeta = betaOf({
        qpr: 1,
        radiusM,
        densityKgM3,
        massSun: star.massSun,
        luminositySun: star.luminositySun,
      });
      const bin = this.binOf(radiusM);
      for (const by of weightings) {
        this.total[by] += weights[by];
        if (unbound) this.unbound[by] += weights[by];
        if (isUnbound(geometricBeta, betaCritical)) this.geometric[by] += weights[by];
        this.bins[by][unbound ? 'unbound' : 'bound'][bin] += by === 'area' ? weights.area * 1e12 : weights[by];
      }
      this.rows += 1;
      if (unbound) this.unboundRows += 1;
      if (isRepelled(results.beta[row])) this.repelled += count;
      this.expected += count * results.pUnbound[row];
      this.squaredCounts += count * count;
      this.addToMaterial(chunk.material[row], count, unbound);
    }
  }

  finish(): { summary: RunSummary; histograms: RunHistograms } {
    const { inputs, materials } = this.prepared;
    const share = (part: Shares, by: keyof Shares) => (this.total[by] > 0 ? part[by] / this.total[by] : 0);
    const numberShare = share(this.unbound, 'number');
    const perMaterial: MaterialSummary[] = [...materials].map(([slug, material]) => {
      const { count, unbound } = this.perMaterial.get(slug) ?? { count: 0, unbound: 0 };
      return materialSummary(this.prepared, material, count > 0 ? unbound / count : 0);
    });
    const effective = effectiveRows(this.total.number, this.squaredCounts);
    const summary: RunSummary = {
      grains: this.rows,
      counted: this.total.number,
      betaCritical: inputs.betaCritical,
      unbound: {
        rows: this.unboundRows,
        number: this.unbound.number,
        numberShare,
        areaShare: share(this.unbound, 'area'),
        massShare: share(this.unbound, 'mass'),
        expectedNumberShare: this.total.number > 0 ? this.expected / this.total.number : 0,
        interval95: wilsonInterval(numberShare, effective),
        repelled: this.repelled,
      },
      geometric: {
        numberShare: share(this.geometric, 'number'),
        areaShare: share(this.geometric, 'area'),
        massShare: share(this.geometric, 'mass'),
      },
      perMaterial,
      warnings: runWarnings(this.prepared, { rows: this.rows, effectiveRows: effective }),
    };
    return { summary, histograms: { edgesUm: this.edgesM.map(micrometres), ...this.bins } };
  }

  private addToMaterial(material: string, count: number, unbound: boolean): void {
    const sums = this.perMaterial.get(material) ?? { count: 0, unbound: 0 };
    sums.count += count;
    if (unbound) sums.unbound += count;
    this.perMaterial.set(material, sums);
  }

  /** Bins are even in the logarithm; rounding may put a grain of the outermost radius just beyond the last edge. */
  private binOf(radiusM: number): number {
    const edges = this.edgesM;
    const bins = edges.length - 1;
    const position = (bins * Math.log(radiusM / edges[0])) / Math.log(edges[bins] / edges[0]);
    return Math.min(bins - 1, Math.max(0, Math.floor(position)));
  }
}
