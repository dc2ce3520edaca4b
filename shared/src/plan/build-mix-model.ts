import type { PartKey } from '../bill/bill-lines.js';
import { type BuildNetwork, type BuildQuestion, type NetworkLine, buildNetwork } from '../bill/build-network.js';
import type { Ratio } from '../bill/ratio.js';
import { ArithmeticError } from '../errors/arithmetic-error.js';
import { Decimal, type DecimalInput, decimal } from '../measure/decimal.js';
import type { LinearModel, ModelRow, ModelVariable } from './linear-model.js';

/** A product that may be built, in whole stock units. */
export interface MixProduct {
  readonly part: PartKey;
  /** What one earns; may be below zero. Any unit, the same for all. */
  readonly earns: DecimalInput;
  /** What is promised and not yet there. */
  readonly promised: number;
  /** How much one kept promise of it counts. Above zero. */
  readonly promiseWeight: DecimalInput;
  readonly atLeast: number;
  /** What could be sold; Infinity for any number. */
  readonly atMost: number;
}

/** From what the shelf holds (and what may arrive by a date, which the asker adds): which products, how many of each. */
export interface MixQuestion extends Pick<BuildQuestion, 'bills' | 'onHand' | 'decimals'> {
  readonly products: readonly MixProduct[];
  /** Minutes at the bench for one stock unit of a made part, lower levels left out. */
  readonly minutes: (part: PartKey) => DecimalInput;
  /** Minutes there are; undefined for no limit. */
  readonly minutesAvailable?: DecimalInput;
}

export interface MixModel extends LinearModel {
  readonly network: BuildNetwork;
  /** By product: the variable that counts what is built of it, and the one that counts kept promises. */
  readonly built: readonly number[];
  readonly served: readonly number[];
  /** By part that can run short: its row. */
  readonly partRows: ReadonlyMap<number, number>;
  readonly benchRow: number | undefined;
  /** By line of the network: the variables of its options' shares; a single one where there is no choice. */
  readonly shares: readonly (readonly number[])[];
}

export interface MixModelOptions {
  readonly servedAtLeast?: number | undefined;
  readonly unbounded?: boolean;
}

/** Names the thing above all products; no part can be called so. */
const everything = '\u0000everything';

/**
 * States the build mix as a whole-number program: what is built of each product and sub-assembly, how each line is
 * filled, what is taken, promises kept, minutes worked. Pieces are rounded up per batch and line; of what is measured
 * finer than pieces, one step per line is kept back instead where a quantity does not come out even.
 *
 * @param question products, bills, shelf, bench
 * @param aim what the model maximises: earnings, or kept promises by weight
 * @param more `servedAtLeast`: with the aim of earning, the weight of promises that must be kept; `unbounded`: leave out
 *   bounds that follow from the rows and only help to search, since they would take the credit that is the rows' own
 * @throws ArithmeticError `plan_mix_product`, and as `buildNetwork`
 */
export function buildMixModel(
  question: MixQuestion,
  aim: 'earn_most' | 'serve_promises',
  more: MixModelOptions = {},
): MixModel {
  const network = productNetwork(question);
  return new MixBuilder(question, network, aim, more).build();
}

function productNetwork({ bills, onHand, decimals, products }: MixQuestion): BuildNetwork {
  const seen = new Set<PartKey>();
  for (const { part, promised, promiseWeight, atLeast, atMost } of products) {
    const counts = [promised, atLeast, ...(atMost === Infinity ? [] : [atMost])];
    const sound = counts.every((count) => Number.isSafeInteger(count) && count >= 0) && atLeast <= atMost;
    const hasBill = (bills.get(part) ?? []).length > 0;
    if (!sound || !hasBill || seen.has(part) || decimal(promiseWeight).lessThanOrEqualTo(0) || decimals(part) !== 0) {
      throw new ArithmeticError('plan_mix_product', { part });
    }
    seen.add(part);
  }
  const top = products.map(({ part }) => ({
    position: part,
    part,
    quantityPer: new Decimal(1),
    scrapShare: new Decimal(0),
    alternates: [],
  }));
  return buildNetwork({
    bills: new Map([...bills, [everything, top]]),
    part: everything,
    onHand,
    decimals: (part) => (part === everything ? 0 : decimals(part)),
  });
}

interface Term {
  readonly variable: number;
  readonly coefficient: number;
}

class MixBuilder {
  private readonly variables: ModelVariable[] = [];
  private readonly rows: ModelRow[] = [];
  private readonly asked: Term[][];
  private readonly keptBack: number[];
  private readonly shares: number[][];
  private readonly bench: Term[] = [];
  private readonly most: ReturnType<typeof mostOfEach>;
  private readonly built: number[];
  private readonly served: number[];

  constructor(
    private readonly question: MixQuestion,
    private readonly network: BuildNetwork,
    aim: 'earn_most' | 'serve_promises',
    { servedAtLeast, unbounded = false }: MixModelOptions,
  ) {
    this.most = unbounded ? withoutBounds(network) : mostOfEach(network);
    this.asked = network.parts.map(() => []);
    this.keptBack = network.parts.map(() => 0);
    this.shares = network.lines.map(() => []);
    const earning = aim === 'earn_most';
    const { products } = question;
    const gain = (value: DecimalInput, counts: boolean): number => (counts ? decimal(value).toNumber() : 0);
    this.built = products.map(({ earns, atLeast, atMost }) => this.add(gain(earns, earning), atLeast, atMost));
    this.served = products.map(({ promised, promiseWeight }, index) => {
      const served = this.add(gain(promiseWeight, !earning), 0, promised);
      this.row([{ variable: served, coefficient: 1 }, ...minus(this.built[index] ?? 0)], 0);
      return served;
    });
    if (servedAtLeast !== undefined) {
      const weights = products.map(({ promiseWeight }) => -decimal(promiseWeight).toNumber());
      this.row(
        this.served.map((variable, index) => ({ variable, coefficient: weights[index] ?? 0 })),
        -servedAtLeast,
      );
    }
  }

  build(): MixModel {
    const productOf = new Map(this.question.products.map(({ part }, index) => [part, index]));
    const partRows = new Map<number, number>();
    this.network.parts.forEach(({ key, stock, lines }, index) => {
      if (index === 0) return;
      const product = productOf.get(key);
      const asked = [...(this.asked[index] ?? []), ...(product === undefined ? [] : plus(this.built[product] ?? 0))];
      const limit = Math.max(0, Number(stock) - (this.keptBack[index] ?? 0));
      if (lines.length === 0) {
        partRows.set(index, this.row(asked, limit));
        return;
      }
      const made = this.add(0, 0, this.most.made[index] ?? 0);
      this.row([...asked, ...minus(made)], limit);
      // What is built to be sold is built now, whatever of it lies there.
      if (product !== undefined) this.row([...plus(this.built[product] ?? 0), ...minus(made)], 0);
      this.work(key, made);
      for (const line of lines) this.fill(line, made);
    });
    const { minutesAvailable } = this.question;
    const benchRow =
      minutesAvailable === undefined ? undefined : this.row(this.bench, decimal(minutesAvailable).toNumber());
    const { variables, rows, network, built, served, shares } = this;
    return { variables, rows, network, built, served, partRows, benchRow, shares };
  }

  private add(gain: number, least: number, most: number, whole = true): number {
    return this.variables.push({ gain, least, most, whole }) - 1;
  }

  private row(terms: readonly Term[], atMost: number): number {
    return this.rows.push({ terms, atMost }) - 1;
  }

  private work(part: PartKey, made: number): void {
    const perStep = decimal(this.question.minutes(part)).div(new Decimal(10).pow(this.question.decimals(part)));
    if (!perStep.isZero()) this.bench.push({ variable: made, coefficient: perStep.toNumber() });
  }

  private fill(lineIndex: number, made: number): void {
    const line = this.network.lines[lineIndex] as NetworkLine;
    const whole = line.options.some(({ part }) => this.network.parts[part]?.decimals === 0);
    const most = Math.ceil((this.most.made[line.parent] ?? 0) * asNumber(line.basis)) + 1;
    const total = this.roundedUp(made, line.basis, whole, most);
    const [only] = line.options;
    const shares = line.options.length > 1 ? line.options.map(() => this.add(0, 0, most)) : [total];
    this.shares[lineIndex] = shares;
    if (only !== undefined && shares.length > 1) this.row([...plus(total), ...shares.flatMap(minus)], 0);
    line.options.forEach(({ part, ratio }, option) => {
      const share = shares[option] ?? total;
      const isPiece = this.network.parts[part]?.decimals === 0;
      if (ratio.denominator === 1n || !isPiece) {
        this.asked[part]?.push({ variable: share, coefficient: asNumber(ratio) });
        if (ratio.denominator !== 1n) this.keptBack[part] = (this.keptBack[part] ?? 0) + 1;
        return;
      }
      this.asked[part]?.push(...plus(this.roundedUp(share, ratio, true, this.most.there[part] ?? 0)));
    });
  }

  /** A variable that is at least amount × ratio; the amount itself where the ratio is one. */
  private roundedUp(amount: number, ratio: Ratio, whole: boolean, most: number): number {
    if (ratio.numerator === ratio.denominator) return amount;
    const result = this.add(0, 0, most, whole);
    this.row([{ variable: amount, coefficient: asNumber(ratio) }, ...minus(result)], 0);
    return result;
  }
}

/**
 * Bounds that help the solver: what could be there of each part, and be made of it, if nothing else wanted what it takes.
 */
function mostOfEach({ parts, lines }: BuildNetwork): { readonly there: number[]; readonly made: number[] } {
  const [there, made] = [parts.map(({ stock }) => Number(stock)), parts.map(() => 0)];
  for (let index = parts.length - 1; index >= 0; index -= 1) {
    const part = parts[index];
    if (part === undefined || part.lines.length === 0) continue;
    const byLine = part.lines.map((line) => {
      const { options, basis } = lines[line] as NetworkLine;
      const shares = options.reduce((sum, option) => sum + (there[option.part] ?? 0) / asNumber(option.ratio), 0);
      return Math.floor(shares / asNumber(basis) + 1e-6);
    });
    made[index] = Math.min(...byLine);
    there[index] = Number(part.stock) + (made[index] ?? 0);
  }
  return { there, made };
}

function withoutBounds({ parts }: BuildNetwork): ReturnType<typeof mostOfEach> {
  return { there: parts.map(() => Infinity), made: parts.map(() => Infinity) };
}

const plus = (variable: number): Term[] => [{ variable, coefficient: 1 }];
const minus = (variable: number): Term[] => [{ variable, coefficient: -1 }];

function asNumber({ numerator, denominator }: Ratio): number {
  return Number(numerator) / Number(denominator);
}
