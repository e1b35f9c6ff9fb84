import { lazy } from 'react';

/**
 * The pad is what a measurer waits for, so it comes first; the other screens are fetched as soon as it
 * stands, while there is a signal.
 */
const leave = () => import('./leave-screen').then((m) => ({ default: m.LeaveScreen }));
const sketch = () => import('./sketch-screen').then((m) => ({ default: m.SketchScreen }));
const feature = () => import('./feature-pad').then((m) => ({ default: m.FeaturePad }));
const list = () => import('./wall-list').then((m) => ({ default: m.WallList }));
const overview = () => import('./walls-overview').then((m) => ({ default: m.WallsOverview }));
const detail = () => import('./reading-detail').then((m) => ({ default: m.ReadingDetail }));
const photo = () =>
  import('@/components/photos/photo-screen').then((m) => ({ default: m.PhotoScreen }));
const sheets = () => import('./pad-sheets').then((m) => ({ default: m.PadSheets }));
const setUp = () => import('./set-up-sheet').then((m) => ({ default: m.SetUpSheet }));

export const LeaveScreen = lazy(leave);
export const SketchScreen = lazy(sketch);
export const FeaturePad = lazy(feature);
export const WallList = lazy(list);
export const WallsOverview = lazy(overview);
export const ReadingDetail = lazy(detail);
export const PhotoScreen = lazy(photo);
export const PadSheets = lazy(sheets);
export const SetUpSheet = lazy(setUp);

/** Fetches what may be opened next, the likeliest first; a miss is tried again when it is opened. */
export async function fetchScreens(): Promise<void> {
  for (const fetchOne of [sheets, setUp, overview, list, detail, feature, leave, photo, sketch]) {
    await fetchOne().catch(() => null);
  }
}
