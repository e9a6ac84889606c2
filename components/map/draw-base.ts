import { type View } from './draw-roads';
import { type MapBaseFeature } from './map-content';
import { type Palette } from './palette';
import { toWorld, type WorldPaths } from './world';

export interface BaseLand {
  readonly coast: WorldPaths;
  readonly lake: WorldPaths;
  readonly river: WorldPaths;
  readonly contour: WorldPaths;
  readonly places: readonly { name: string; isWater: boolean; x: number; y: number }[];
}

export function baseLand(features: readonly MapBaseFeature[]): BaseLand {
  const partsOf = (kind: MapBaseFeature['kind']) =>
    toWorld(features.filter((feature) => feature.kind === kind).flatMap((feature) => feature.parts));
  const places = features
    .filter((feature) => feature.kind === 'town' || feature.kind === 'water-name')
    .map((feature) => {
      const { xs, ys } = toWorld(feature.parts);
      return { name: feature.name, isWater: feature.kind === 'water-name', x: xs[0] ?? 0, y: ys[0] ?? 0 };
    });
  return {
    coast: partsOf('coast'),
    lake: partsOf('lake'),
    river: partsOf('river'),
    contour: partsOf('contour'),
    places,
  };
}

function trace(pen: CanvasRenderingContext2D, paths: WorldPaths, view: View): void {
  pen.beginPath();
  for (let path = 0; path < paths.count; path += 1) {
    const start = paths.starts[path] ?? 0;
    for (let index = start; index < (paths.starts[path + 1] ?? 0); index += 1) {
      const x = (paths.xs[index] ?? 0) * view.scale - view.originX;
      const y = (paths.ys[index] ?? 0) * view.scale - view.originY;
      if (index === start) pen.moveTo(x, y);
      else pen.lineTo(x, y);
    }
  }
}

function stroke(pen: CanvasRenderingContext2D, colour: string, widthPx: number, alpha = 1): void {
  pen.globalAlpha = alpha;
  pen.strokeStyle = colour;
  pen.lineWidth = widthPx;
  pen.stroke();
  pen.globalAlpha = 1;
}

/** Sea, the shallows along the shore, land, heights, rivers and lakes; plain ground where there is no coast. */
export function drawBase(pen: CanvasRenderingContext2D, land: BaseLand, given: { palette: Palette; view: View }): void {
  const { palette, view } = given;
  const colour = (token: string) => palette[token] ?? '';
  const near = Math.min(2, Math.max(0.5, 2 ** (view.zoom - 11)));
  pen.lineJoin = 'round';
  pen.lineCap = 'round';
  pen.clearRect(0, 0, view.widthPx, view.heightPx);
  if (land.coast.count > 0) {
    pen.fillStyle = colour('sea');
    pen.fillRect(0, 0, view.widthPx, view.heightPx);
    trace(pen, land.coast, view);
    for (const [widthPx, alpha] of [
      [46, 0.35],
      [30, 0.5],
      [15, 0.9],
    ] as const) {
      stroke(pen, colour('shore'), widthPx * near, alpha);
    }
    pen.fillStyle = colour('ground');
    pen.fill();
    stroke(pen, colour('line'), 1.25);
  }
  trace(pen, land.contour, view);
  stroke(pen, colour('line'), 1, 0.6);
  trace(pen, land.river, view);
  stroke(pen, colour('shore'), 7 * near, 0.9);
  trace(pen, land.lake, view);
  pen.fillStyle = colour('sea');
  pen.fill();
  stroke(pen, colour('shore'), 4);
}

/** Names stand over the roads, each with a rim of ground so that a line behind it does not strike it out. */
export function drawPlaces(
  pen: CanvasRenderingContext2D,
  land: BaseLand,
  given: { palette: Palette; view: View },
): void {
  const { palette, view } = given;
  pen.textAlign = 'center';
  pen.textBaseline = 'middle';
  for (const place of land.places) {
    const x = place.x * view.scale - view.originX;
    const y = place.y * view.scale - view.originY;
    pen.font = place.isWater ? `italic 400 14px ${palette.face}` : `600 14px ${palette.face}`;
    pen.letterSpacing = place.isWater ? '3px' : '0.3px';
    if (!place.isWater) {
      pen.strokeStyle = palette['ground'] ?? '';
      pen.lineWidth = 4;
      pen.lineJoin = 'round';
      pen.strokeText(place.name, x, y);
    }
    pen.fillStyle = (place.isWater ? palette['faint'] : palette['ink']) ?? '';
    pen.fillText(place.name, x, y);
  }
  pen.letterSpacing = '0px';
}
