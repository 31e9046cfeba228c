import { useSearchParams } from 'react-router';
import {
  type MapScale,
  mapScales,
  type MapView,
  mapViews,
} from '../../charts/boundaryMap/mapScene.ts';

/** How the map is looked at, kept in the URL so that a link shows the same picture. */
export interface MapViewState {
  view: MapView;
  scale: MapScale;
  /** label of the chosen configuration */
  position: string | null;
  change: (change: Partial<Record<'view' | 'scale' | 'position', string>>) => void;
  /** the same screen with another configuration chosen, as a link */
  linkTo: (position: string) => string;
}

/** The natural scale of a view: τ/I is straight on log axes against inertia. */
const usualScale: Record<MapView, MapScale> = { inertia: 'log', position: 'linear' };

export function useMapView(): MapViewState {
  const [params, setParams] = useSearchParams();
  const view = mapViews.find((one) => one === params.get('view')) ?? 'inertia';
  const scale = mapScales.find((one) => one === params.get('scale')) ?? usualScale[view];
  const changed = (change: Partial<Record<string, string>>) => {
    const next = new URLSearchParams(params);
    if (change.view !== undefined) next.delete('scale');
    for (const [name, value] of Object.entries(change)) {
      if (value !== undefined) next.set(name, value);
    }
    return next;
  };
  return {
    view,
    scale,
    position: params.get('position'),
    change: (change) => {
      setParams(changed(change), { replace: true, preventScrollReset: true });
    },
    linkTo: (position) => `?${changed({ position }).toString()}`,
  };
}
