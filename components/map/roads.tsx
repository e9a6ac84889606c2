'use client';

import L from 'leaflet';
import { useEffect, useEffectEvent, useRef, useState } from 'react';
import { useMap, useMapEvents } from 'react-leaflet';
import { boundsOf } from './bounds';
import { RoadLayer } from './road-layer';
import { type RoadMapProps } from './road-map';

type RoadsProps = Pick<
  RoadMapProps,
  'segments' | 'styles' | 'selectedId' | 'highlightIds' | 'onSelect' | 'describe' | 'fitKey' | 'label'
> &
  Required<Pick<RoadMapProps, 'baseFeatures'>>;

const reachPx = { mouse: 9, touch: 20 } as const;
const none: readonly number[] = [];

const tipLook =
  '!rounded-md !border !border-line !bg-raised !px-2 !py-1 !text-sm !text-ink !shadow-lg before:!hidden !font-sans';

const isStill = () => matchMedia('(prefers-reduced-motion: reduce)').matches;

/** Keeps the canvas in step with the props, and turns a click into a chosen road. */
export function Roads(props: RoadsProps) {
  const { segments, styles, baseFeatures, selectedId = null, highlightIds = none, onSelect, describe } = props;
  const map = useMap();
  const [layer] = useState(() => new RoadLayer());
  useEffect(() => {
    layer.addTo(map);
    return () => void layer.remove();
  }, [layer, map]);
  useEffect(() => layer.setSegments(segments), [layer, segments]);
  useEffect(() => layer.setBase(baseFeatures), [layer, baseFeatures]);
  useEffect(() => layer.setStyles(styles), [layer, styles]);
  useEffect(() => layer.setChosen(selectedId, highlightIds), [layer, segments, selectedId, highlightIds]);
  useFit(props);
  useShowChosen(props);
  const tip = useTip(map);
  useMapEvents({
    click: ({ latlng, originalEvent }) => {
      const isTouch = (originalEvent as PointerEvent).pointerType === 'touch';
      const hit = layer.segmentAt(latlng, isTouch ? reachPx.touch : reachPx.mouse);
      if (hit) onSelect?.(hit.segment.id);
    },
    mousemove: ({ latlng }) => {
      const hit = layer.segmentAt(latlng, reachPx.mouse);
      map.getContainer().style.cursor = hit && onSelect ? 'pointer' : '';
      tip(hit ? (describe?.(hit.index) ?? hit.segment.name) : null, latlng);
    },
    mouseout: () => tip(null, map.getCenter()),
  });
  return null;
}

/** Fits the map to the roads when asked to, but not again when the map has only just been made. */
function useFit({ segments, baseFeatures, fitKey, label }: RoadsProps): void {
  const map = useMap();
  const fittedFor = useRef(fitKey);
  const fit = useEffectEvent(() =>
    map.fitBounds(boundsOf(segments, baseFeatures), { padding: [24, 24], animate: false }),
  );
  useEffect(() => {
    if (fittedFor.current === fitKey) return;
    fittedFor.current = fitKey;
    fit();
  }, [fitKey]);
  useEffect(() => {
    const container = map.getContainer();
    container.setAttribute('role', 'application');
    container.setAttribute('aria-roledescription', 'map');
    container.setAttribute('aria-label', `${label}. Arrow keys move the map, plus and minus zoom.`);
  }, [map, label]);
  useEffect(() => {
    // Until a person moves it, the map stays fitted whatever becomes of its window.
    let isOwn = false;
    const take = () => {
      isOwn = true;
    };
    const container = map.getContainer();
    const events = ['pointerdown', 'wheel', 'keydown'] as const;
    for (const event of events) container.addEventListener(event, take, { passive: true });
    const observer = new ResizeObserver(() => {
      map.invalidateSize({ animate: false, pan: isOwn });
      if (!isOwn && map.getSize().x > 0) fit();
    });
    observer.observe(container);
    return () => {
      observer.disconnect();
      for (const event of events) container.removeEventListener(event, take);
    };
  }, [map]);
}

/** Brings a road chosen elsewhere into the window. */
function useShowChosen({ segments, selectedId }: RoadsProps): void {
  const map = useMap();
  const show = useEffectEvent((id: number) => {
    const path = segments.find((segment) => segment.id === id)?.path;
    const middle = path?.[Math.floor(path.length / 2)];
    if (!middle) return;
    const point = map.latLngToContainerPoint([middle[0], middle[1]]);
    const size = map.getSize();
    const isSeen = point.x > 40 && point.y > 40 && point.x < size.x - 40 && point.y < size.y - 40;
    if (!isSeen && size.x > 0) map.panTo([middle[0], middle[1]], { animate: !isStill() });
  });
  useEffect(() => {
    if (selectedId !== null && selectedId !== undefined) show(selectedId);
  }, [selectedId]);
}

/** A small label that follows the pointer: written to the page directly, so that moving the mouse renders nothing. */
function useTip(map: L.Map): (text: string | null, at: L.LatLng) => void {
  const [tooltip] = useState(() => L.tooltip({ direction: 'top', offset: [0, -8], opacity: 1, className: tipLook }));
  useEffect(() => () => void tooltip.remove(), [tooltip]);
  return (text, at) => {
    if (text === null) {
      tooltip.remove();
      return;
    }
    tooltip.setLatLng(at).setContent(document.createTextNode(text) as unknown as HTMLElement);
    if (!map.hasLayer(tooltip)) tooltip.addTo(map);
  };
}
