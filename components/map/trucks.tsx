'use client';

import L from 'leaflet';
import { useEffect } from 'react';
import { useMap } from 'react-leaflet';
import { type MapTruck } from './map-content';

const look =
  'relative grid size-[1.625rem] place-items-center after:absolute after:top-full after:left-1/2 after:h-1.5 after:w-0.5 after:-translate-x-1/2 after:bg-lamp rounded-[0.25rem] bg-lamp text-sm font-bold text-on-lamp shadow-[0_1px_4px_rgb(0_0_0/0.5)]';

function truckIcon(truck: MapTruck): L.DivIcon {
  const plate = document.createElement('span');
  plate.className = look;
  plate.textContent = String(truck.number);
  plate.title = truck.label;
  return L.divIcon({ html: plate, className: '', iconSize: [26, 26], iconAnchor: [13, 32] });
}

/** The trucks that are out, by number, where they last said they were. */
export function Trucks({ trucks }: Readonly<{ trucks: readonly MapTruck[] }>) {
  const map = useMap();
  useEffect(() => {
    const group = L.layerGroup(
      trucks.map((truck) => {
        const marker = L.marker([truck.position[0], truck.position[1]], {
          icon: truckIcon(truck),
          interactive: false,
          keyboard: false,
        });
        marker.on('add', () => {
          marker.getElement()?.setAttribute('role', 'img');
          marker.getElement()?.setAttribute('aria-label', truck.label);
        });
        return marker;
      }),
    ).addTo(map);
    return () => void group.remove();
  }, [map, trucks]);
  return null;
}
