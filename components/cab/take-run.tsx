'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { EmptyState } from '@/components/ui/empty-state';
import { Figure } from '@/components/ui/figure';
import { Segmented } from '@/components/ui/segmented';
import { classNames } from '@/components/ui/class-names';
import { RoadPicker, type RoadChoiceView } from './road-picker';

export interface TruckChoice {
  id: number;
  number: number;
  yardName: string;
  hopperKg: number;
  outWith: string | null;
}
export interface RouteChoice {
  id: number;
  name: string;
  yardName: string;
  truckNumber: number | null;
  roads: number;
  laneKm: number;
}

export type TakeRunProps = Readonly<{
  driverName: string;
  trucks: readonly TruckChoice[];
  routes: readonly RouteChoice[];
  roads: readonly RoadChoiceView[];
  onStart: (choice: { truckId: number; routeId: number | null; segmentIds: number[] }) => void;
  isStarting: boolean;
}>;

/** Truck, then a route or a list of roads, then off. */
export function TakeRun({ driverName, trucks, routes, roads, onStart, isStarting }: TakeRunProps) {
  const [truckId, setTruckId] = useState<number | null>(null);
  const [kind, setKind] = useState<'route' | 'roads'>('route');
  const [routeId, setRouteId] = useState<number | null>(null);
  const [segmentIds, setSegmentIds] = useState<readonly number[]>([]);
  const missing = reasonMissing(truckId, kind === 'route' ? routeId !== null : segmentIds.length > 0, kind);
  if (trucks.length === 0)
    return (
      <EmptyState title="There is no truck to take.">Ask an administrator to add trucks in Set-up, Fleet.</EmptyState>
    );
  return (
    <div className="mx-auto grid w-full max-w-3xl gap-8 p-6">
      <header>
        <h1 className="text-4xl font-bold">Take a run</h1>
        <p className="text-xl text-soft">{driverName}, choose your truck and what to treat.</p>
      </header>
      <ChoiceList label="Truck">
        {trucks.map((truck) => (
          <Choice
            key={truck.id}
            isChosen={truck.id === truckId}
            isOff={truck.outWith !== null}
            onChoose={() => setTruckId(truck.id)}
            title={`Truck ${truck.number}`}
            beside={
              truck.outWith ? (
                `out with ${truck.outWith}`
              ) : (
                <>
                  {truck.yardName}, <Figure value={truck.hopperKg} quantity="largeMass" size="inline" />
                </>
              )
            }
          />
        ))}
      </ChoiceList>
      <Segmented
        label="What to treat"
        size="cab"
        options={[
          { value: 'route', label: 'A route' },
          { value: 'roads', label: 'A list of roads' },
        ]}
        value={kind}
        onChange={setKind}
      />
      {kind === 'route' ? (
        <ChoiceList label="Route">
          {routes.map((route) => (
            <Choice
              key={route.id}
              isChosen={route.id === routeId}
              onChoose={() => setRouteId(route.id)}
              title={route.name}
              beside={
                <>
                  {route.roads} roads, <Figure value={route.laneKm * 1000} quantity="laneDistance" size="inline" />
                </>
              }
            />
          ))}
        </ChoiceList>
      ) : (
        <RoadPicker roads={roads} chosen={segmentIds} onChange={setSegmentIds} />
      )}
      <Button
        variant="primary"
        size="cab-tall"
        disabledReason={missing}
        isBusy={isStarting}
        busyLabel="Starting"
        onClick={() =>
          truckId === null
            ? undefined
            : onStart({
                truckId,
                routeId: kind === 'route' ? routeId : null,
                segmentIds: kind === 'roads' ? [...segmentIds] : [],
              })
        }
      >
        Start the run
      </Button>
      {missing ? <p className="-mt-4 text-lg text-soft">{missing}</p> : null}
    </div>
  );
}

function reasonMissing(truckId: number | null, hasRoads: boolean, kind: 'route' | 'roads'): string | null {
  if (truckId === null) return 'Choose a truck.';
  if (!hasRoads) return kind === 'route' ? 'Choose a route.' : 'Choose at least one road.';
  return null;
}

function ChoiceList({ label, children }: Readonly<{ label: string; children: React.ReactNode }>) {
  return (
    <section aria-label={label}>
      <h2 className="mb-2 text-xl font-bold">{label}</h2>
      <div className="grid gap-2 sm:grid-cols-2">{children}</div>
    </section>
  );
}

type ChoiceProps = Readonly<{
  isChosen: boolean;
  isOff?: boolean;
  onChoose: () => void;
  title: string;
  beside: React.ReactNode;
}>;

function Choice({ isChosen, isOff = false, onChoose, title, beside }: ChoiceProps) {
  return (
    <button
      type="button"
      aria-pressed={isChosen}
      disabled={isOff}
      onClick={onChoose}
      className={classNames(
        'flex min-h-18 flex-wrap items-center justify-between gap-x-4 rounded-lg border-2 px-5 py-3 text-left text-xl',
        isChosen ? 'border-lamp bg-raised' : 'hover:border-faint',
        isOff && 'cursor-not-allowed text-faint hover:border-line',
      )}
    >
      <span className="font-semibold">{title}</span>
      <span className="text-lg text-soft">{beside}</span>
    </button>
  );
}
