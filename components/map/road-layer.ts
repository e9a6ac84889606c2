import L from 'leaflet';
import { baseLand, drawBase, drawPlaces, type BaseLand } from './draw-base';
import { classCodes, drawRoads, projectPaths, type GlassPaths, type View } from './draw-roads';
import { hitGrid, type HitGrid } from './hit-grid';
import { type MapBaseFeature, type MapSegment } from './map-content';
import { readPalette, watchTheme, type Palette } from './palette';
import { toWorld, type WorldPaths } from './world';

/** How much is drawn beyond each edge of the window, so that a pan shows roads before it ends. */
const BEYOND = 0.35;
const TILE_PX = 256;

/**
 * Every road on one canvas, over one for the land. A pan only moves the two; they are drawn again when it ends or leaves
 * what was drawn beyond the edges. A change of style draws the roads alone.
 */
export class RoadLayer extends L.Layer {
  private readonly land = document.createElement('canvas');
  private readonly roads = document.createElement('canvas');
  private glassMap: L.Map | null = null;
  private segments: readonly MapSegment[] = [];
  private paths: WorldPaths = toWorld([]);
  private grid: HitGrid = hitGrid(this.paths);
  private indexById = new Map<number, number>();
  private classes = classCodes([]);
  private styles = new Uint8Array();
  private base: BaseLand = baseLand([]);
  private selected: number | null = null;
  private highlighted: ReadonlySet<number> = new Set();
  private palette: Palette | null = null;
  private view: View | null = null;
  private glass: GlassPaths | null = null;
  private drawnCentre: L.LatLng | null = null;
  private frame = 0;
  private stopWatching: () => void = () => undefined;

  override onAdd(map: L.Map): this {
    this.glassMap = map;
    const pane = map.getPanes().overlayPane;
    for (const canvas of [this.land, this.roads]) {
      canvas.className = 'leaflet-zoom-animated pointer-events-none';
      canvas.setAttribute('aria-hidden', 'true');
      pane.appendChild(canvas);
    }
    this.stopWatching = watchTheme(() => {
      this.palette = null;
      this.drawAll();
    });
    void document.fonts.ready.then(() => this.schedule());
    this.drawAll();
    return this;
  }

  override onRemove(): this {
    this.stopWatching();
    cancelAnimationFrame(this.frame);
    this.frame = 0;
    this.land.remove();
    this.roads.remove();
    this.glassMap = null;
    return this;
  }

  override getEvents(): Record<string, L.LeafletEventHandlerFn> {
    return {
      moveend: () => this.drawAll(),
      resize: () => this.drawAll(),
      move: () => this.followPan(),
      zoom: () => this.glassMap && this.stretch(this.glassMap.getCenter(), this.glassMap.getZoom()),
      zoomanim: (event) => {
        const { center, zoom } = event as L.ZoomAnimEvent;
        this.stretch(center, zoom);
      },
    };
  }

  setSegments(segments: readonly MapSegment[]): void {
    this.segments = segments;
    this.paths = toWorld(segments.map((segment) => segment.path));
    this.grid = hitGrid(this.paths);
    this.classes = classCodes(segments);
    this.indexById = new Map(segments.map((segment, index) => [segment.id, index]));
    this.glass = null;
    this.schedule();
  }

  setBase(features: readonly MapBaseFeature[]): void {
    this.base = baseLand(features);
    if (this.glassMap) this.drawAll();
  }

  setStyles(styles: Uint8Array): void {
    this.styles = styles as Uint8Array<ArrayBuffer>;
    this.schedule();
  }

  setChosen(selectedId: number | null, highlightIds: readonly number[]): void {
    this.selected = selectedId === null ? null : (this.indexById.get(selectedId) ?? null);
    this.highlighted = new Set(highlightIds.flatMap((id) => this.indexById.get(id) ?? []));
    this.schedule();
  }

  /** The road within `reachPx` of a point of the window, or null. */
  segmentAt(point: L.LatLng, reachPx: number): { segment: MapSegment; index: number } | null {
    if (!this.glassMap) return null;
    const scale = TILE_PX * 2 ** this.glassMap.getZoom();
    const world = this.glassMap.project(point).divideBy(scale);
    const index = this.grid.nearest(world.x, world.y, reachPx / scale);
    const segment = index === null ? undefined : this.segments[index];
    return segment && index !== null ? { segment, index } : null;
  }

  private schedule(): void {
    if (this.frame !== 0 || !this.glassMap) return;
    this.frame = requestAnimationFrame(() => {
      this.frame = 0;
      this.drawRoadsNow();
    });
  }

  /** Lays both canvases over the window as it now is, and draws. */
  private drawAll(): void {
    const map = this.glassMap;
    if (!map) return;
    const size = map.getSize();
    const beyond = size.multiplyBy(BEYOND).round();
    const corner = map.containerPointToLayerPoint(beyond.multiplyBy(-1)).round();
    const full = size.add(beyond.multiplyBy(2));
    const origin = map.getPixelOrigin().add(corner);
    const zoom = map.getZoom();
    const scale = TILE_PX * 2 ** zoom;
    this.view = { scale, originX: origin.x, originY: origin.y, widthPx: full.x, heightPx: full.y, zoom };
    this.drawnCentre = map.getCenter();
    this.glass = null;
    for (const canvas of [this.land, this.roads]) {
      fitCanvas(canvas, full);
      L.DomUtil.setTransform(canvas, corner, 1);
    }
    const pen = penOf(this.land);
    if (pen) drawBase(pen, this.base, { palette: this.colours(), view: this.view });
    this.drawRoadsNow();
  }

  private drawRoadsNow(): void {
    const pen = penOf(this.roads);
    const { view } = this;
    if (!pen || !view) return;
    const startedAt = performance.now();
    this.glass ??= projectPaths(this.paths, view);
    const { glass, styles, classes, selected, highlighted } = this;
    pen.clearRect(0, 0, view.widthPx, view.heightPx);
    drawRoads(pen, { glass, styles, classes, selected, highlighted }, { palette: this.colours(), zoom: view.zoom });
    drawPlaces(pen, this.base, { palette: this.colours(), view });
    performance.measure('roads drawn', { start: startedAt });
  }

  private colours(): Palette {
    return (this.palette ??= readPalette(this.glassMap?.getContainer() ?? document.documentElement));
  }

  private followPan(): void {
    const map = this.glassMap;
    if (!map || !this.drawnCentre || map.getZoom() !== this.view?.zoom) return;
    const moved = map.latLngToLayerPoint(map.getCenter()).subtract(map.latLngToLayerPoint(this.drawnCentre));
    const size = map.getSize();
    if (Math.abs(moved.x) > size.x * BEYOND * 0.9 || Math.abs(moved.y) > size.y * BEYOND * 0.9) this.drawAll();
  }

  /** Stretches what is drawn to where it will lie at another zoom, while Leaflet zooms. */
  private stretch(center: L.LatLng, zoom: number): void {
    const map = this.glassMap;
    if (!map || !this.view || !this.drawnCentre) return;
    const grow = map.getZoomScale(zoom, this.view.zoom);
    const half = map.getSize().multiplyBy(0.5 + BEYOND);
    const corner = map
      .project(this.drawnCentre, zoom)
      .subtract(half.multiplyBy(grow))
      .subtract(originAt(map, center, zoom));
    for (const canvas of [this.land, this.roads]) L.DomUtil.setTransform(canvas, corner, grow);
  }
}

/** Where Leaflet will put its pixel origin once it has zoomed there. */
function originAt(map: L.Map, center: L.LatLng, zoom: number): L.Point {
  const half = map.getSize().divideBy(2);
  const panned = map.containerPointToLayerPoint([0, 0]);
  return map.project(center, zoom).subtract(half).subtract(panned).round();
}

function fitCanvas(canvas: HTMLCanvasElement, size: L.Point): void {
  const ratio = Math.min(2, globalThis.devicePixelRatio || 1);
  const width = Math.round(size.x * ratio);
  const height = Math.round(size.y * ratio);
  if (canvas.width !== width || canvas.height !== height) {
    canvas.width = width;
    canvas.height = height;
    canvas.style.width = `${size.x}px`;
    canvas.style.height = `${size.y}px`;
  }
  canvas.getContext('2d')?.setTransform(ratio, 0, 0, ratio, 0, 0);
}

function penOf(canvas: HTMLCanvasElement): CanvasRenderingContext2D | null {
  return canvas.getContext('2d');
}
