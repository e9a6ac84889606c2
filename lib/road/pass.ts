import { salts, type Salt } from '../brine/salts';
import { type Film, type FilmLoss } from './film';

/** A product as the road sees it: mass fractions of anhydrous salts and of water; what is left is inert. */
export interface Product {
  readonly composition: Readonly<Partial<Record<Salt, number>>>;
  readonly waterMassFraction: number;
  /** time constant of its grains, min; 0 dissolves at once */
  readonly dissolveMin: number;
}

/** One visit of a truck: the plough first, then the spreader. */
export interface Pass {
  isPloughed: boolean;
  product: Product | null;
  /** g/m² of product that leaves the spreader */
  rateGPerM2: number;
  /** part of it that does not stay on the lane, 0 to 1 */
  scatter: number;
}

/**
 * The plough takes loose ice and slush down to `residualMm` of water with their share of the salts. Bonded ice and
 * plain wet stay.
 */
export function ploughFilm(film: Film, residualMm: number, loss: FilmLoss | null = null): void {
  const waterMm = film.liquidMm + film.frozenMm;
  if (film.isBonded || film.frozenMm <= 0 || waterMm <= residualMm) return;
  const stays = residualMm / waterMm;
  film.liquidMm *= stays;
  film.frozenMm *= stays;
  for (const salt of salts) {
    for (const masses of [film.dissolved, film.undissolved]) {
      const gone = masses[salt] * (1 - stays);
      masses[salt] -= gone;
      if (loss) loss.salts[salt] += gone;
    }
  }
  film.fellAsSnowMm *= film.fellMm > residualMm ? residualMm / film.fellMm : 1;
  film.fellMm = Math.min(film.fellMm, residualMm);
  if (loss) loss.ploughedMm += waterMm * (1 - stays);
}

/**
 * Spreads `rateGPerM2` of a product, of which `1 − scatter` lands: salts by its composition, and its own water as
 * liquid. RangeError for a negative rate or a scatter outside 0 to 1.
 */
export function spreadOn(film: Film, { product, rateGPerM2, scatter }: Pass): void {
  if (!(rateGPerM2 >= 0 && scatter >= 0 && scatter <= 1)) {
    throw new RangeError(`A rate is 0 or more and a scatter 0 to 1, not ${rateGPerM2} and ${scatter}`);
  }
  if (!product || rateGPerM2 === 0) return;
  const landedG = rateGPerM2 * (1 - scatter);
  const into = product.dissolveMin > 0 ? film.undissolved : film.dissolved;
  for (const salt of salts) into[salt] += landedG * (product.composition[salt] ?? 0);
  film.liquidMm += (landedG * product.waterMassFraction) / 1000;
  if (product.dissolveMin > 0) film.dissolveMin = product.dissolveMin;
}

/** Ploughs if the pass does, then spreads. Changes the film. */
export function passOver(film: Film, pass: Pass, residualMm: number, loss: FilmLoss | null = null): void {
  if (pass.isPloughed) ploughFilm(film, residualMm, loss);
  spreadOn(film, pass);
}
