import { salts } from '../brine/salts';
import { copyFilm, noLoss, type Film, type FilmLoss } from './film';
import { LATENT_HEAT_KJ_PER_KG, type FilmParameters } from './parameters';
import { heldLiquidMm } from './partition';
import { frozenShare, isSnowLike, type PrecipitationType } from './precipitation';

/** The weather and traffic of one step. */
export interface FilmStep {
  durationMin: number;
  /** pavement temperature at the end of the step, °C */
  tempC: number;
  /** water that falls in the step, mm */
  precipitationMm: number;
  precipitationType: PrecipitationType;
  /** vehicles over the lane in the step */
  vehicles: number;
}

interface Context {
  parameters: FilmParameters;
  loss: FilmLoss | null;
}

/** Above this pavement temperature what lay there thaws by itself, °C; common practice, no source. */
const THAWED_C = 0.5;

function fall(film: Film, step: FilmStep): void {
  const { precipitationMm, precipitationType, tempC } = step;
  if (film.sinceSnowMin !== null) film.sinceSnowMin += step.durationMin;
  if (tempC > THAWED_C) {
    film.fellMm = 0;
    film.fellAsSnowMm = 0;
    film.sinceSnowMin = null;
    film.isBonded = false;
  }
  if (!(precipitationMm > 0) || precipitationType === 'none') return;
  const frozenMm = precipitationMm * frozenShare(precipitationType, tempC);
  film.frozenMm += frozenMm;
  film.liquidMm += precipitationMm - frozenMm;
  film.fellMm += precipitationMm;
  if (isSnowLike(precipitationType, tempC)) {
    film.fellAsSnowMm += precipitationMm;
    film.sinceSnowMin = 0;
  }
}

function dissolve(film: Film, durationMin: number): void {
  if (film.liquidMm + film.frozenMm <= 0) return;
  const share = film.dissolveMin > 0 ? 1 - Math.exp(-durationMin / film.dissolveMin) : 1;
  for (const salt of salts) {
    const grains = film.undissolved[salt];
    if (grains === 0) continue;
    // The last crumbs go at once, so that a film is not carried on with them for ever.
    const goes = grains < 1e-6 ? grains : grains * share;
    film.undissolved[salt] = grains - goes;
    film.dissolved[salt] += goes;
  }
}

/** mm of ice that a heat flux melts in a time. 120 W/m² over 10 min: 0.2156. */
export function meltableMm(fluxWPerM2: number, durationMin: number): number {
  return (fluxWPerM2 * durationMin * 60) / (LATENT_HEAT_KJ_PER_KG * 1000);
}

/** Moves water between liquid and frozen towards the freezing curve, no faster than heat comes and goes. */
export function settle(film: Film, step: { tempC: number; durationMin: number }, parameters: FilmParameters): void {
  const waterMm = film.liquidMm + film.frozenMm;
  if (waterMm <= 0) return;
  const aimMm = Math.min(waterMm, heldLiquidMm(film.dissolved, step.tempC));
  const melts = aimMm - film.liquidMm;
  const limitMm = meltableMm(melts > 0 ? parameters.meltFluxWPerM2 : parameters.freezeFluxWPerM2, step.durationMin);
  const moved = melts > 0 ? Math.min(melts, limitMm) : Math.max(melts, -limitMm);
  film.liquidMm = Math.min(waterMm, Math.max(0, film.liquidMm + moved));
  film.frozenMm = waterMm - film.liquidMm;
}

/** Takes a share of the liquid with the salts in it. */
function takeLiquid(film: Film, share: number, loss: FilmLoss | null): number {
  const goneMm = film.liquidMm * share;
  film.liquidMm -= goneMm;
  for (const salt of salts) {
    const gone = film.dissolved[salt] * share;
    if (gone === 0) continue;
    film.dissolved[salt] -= gone;
    if (loss) loss.salts[salt] += gone;
  }
  return goneMm;
}

function drain(film: Film, durationMin: number, { parameters, loss }: Context): void {
  const excessMm = film.liquidMm - parameters.textureMm;
  if (excessMm <= 0) return;
  const share = (excessMm * (1 - Math.exp(-durationMin / parameters.drainMin))) / film.liquidMm;
  const goneMm = takeLiquid(film, share, loss);
  if (loss) loss.drainedMm += goneMm;
}

/** Wheels take liquid with its salts as spray, and blow grains off; ice stays, which is the careful side. */
function drive(film: Film, vehicles: number, { parameters, loss }: Context): void {
  if (vehicles <= 0) return;
  const { wetFromMm, moistFromMm, lossPer1000Vehicles: k } = parameters;
  const exponent = film.liquidMm >= wetFromMm ? k.wet : film.liquidMm >= moistFromMm ? k.moist : k.dry;
  const share = 1 - Math.exp((-exponent * vehicles) / 1000);
  const goneMm = takeLiquid(film, share, loss);
  if (loss) loss.sprayedMm += goneMm;
  for (const salt of salts) {
    const gone = film.undissolved[salt] * share;
    if (gone === 0) continue;
    film.undissolved[salt] -= gone;
    if (loss) loss.salts[salt] += gone;
  }
}

function evaporate(film: Film, step: FilmStep, { parameters, loss }: Context): void {
  if (!parameters.evaporationMm) return;
  const goesMm = Math.min(film.liquidMm, parameters.evaporationMm(film, step));
  film.liquidMm -= goesMm;
  if (loss) loss.evaporatedMm += goesMm;
}

/** `stepFilm` on the film itself, for engines that step millions of times. */
export function advanceFilm(film: Film, step: FilmStep, context: Context): void {
  fall(film, step);
  dissolve(film, step.durationMin);
  settle(film, step, context.parameters);
  drain(film, step.durationMin, context);
  drive(film, step.vehicles, context);
  evaporate(film, step, context);
}

/**
 * The film after one step of 5–15 min, and what left it. In order: precipitation by type; grains dissolve with the time
 * constant of their product (liquids at once; pre-wetted 5 min, dry 15 min: common practice, no source); liquid and ice
 * are parted on the freezing curve of the mixture, melting no faster than heat arrives (334 kJ/kg); liquid above what
 * the texture holds runs off with its salts; traffic takes spray and blows grains off, `exp(−k N)`; evaporation where
 * the parameters supply it. Water and each salt are conserved: before + fallen = after + lost.
 *
 * −60 to +60 °C; longer steps are allowed and less exact. RangeError for a step of no time, negative amounts or a
 * temperature that is no number.
 */
export function stepFilm(film: Film, step: FilmStep, parameters: FilmParameters): { film: Film; lost: FilmLoss } {
  if (!(step.durationMin > 0)) throw new RangeError(`A step takes more than 0 min, not ${step.durationMin}`);
  if (!(step.precipitationMm >= 0 && step.vehicles >= 0)) {
    throw new RangeError(`Rain and vehicles are 0 or more, not ${step.precipitationMm} and ${step.vehicles}`);
  }
  if (!(step.tempC >= -60 && step.tempC <= 60)) throw new RangeError(`A road is −60 to 60 °C, not ${step.tempC}`);
  const after = copyFilm(film);
  const lost = noLoss();
  advanceFilm(after, step, { parameters, loss: lost });
  return { film: after, lost };
}
