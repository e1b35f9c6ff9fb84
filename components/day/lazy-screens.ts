import { lazy } from 'react';

/** The stop itself comes first; what lies behind it is fetched while there is a signal. */
const bring = () => import('./bring-screen').then((m) => ({ default: m.BringScreen }));
const checks = () => import('./checklist-screen').then((m) => ({ default: m.ChecklistScreen }));
const snags = () => import('./snags-screen').then((m) => ({ default: m.SnagsScreen }));
const newSnag = () => import('./new-snag-screen').then((m) => ({ default: m.NewSnagScreen }));
const snag = () => import('./snag-screen').then((m) => ({ default: m.SnagScreen }));
const mend = () => import('./mend-screen').then((m) => ({ default: m.MendScreen }));
const sign = () => import('./sign-screen').then((m) => ({ default: m.SignScreen }));
const setting = () => import('./setting-screen').then((m) => ({ default: m.SettingScreen }));
const asFound = () => import('./as-found-screen').then((m) => ({ default: m.AsFoundScreen }));
const photo = () =>
  import('@/components/photos/photo-screen').then((m) => ({ default: m.PhotoScreen }));

export const BringScreen = lazy(bring);
export const ChecklistScreen = lazy(checks);
export const SnagsScreen = lazy(snags);
export const NewSnagScreen = lazy(newSnag);
export const SnagScreen = lazy(snag);
export const MendScreen = lazy(mend);
export const SignScreen = lazy(sign);
export const SettingScreen = lazy(setting);
export const AsFoundScreen = lazy(asFound);
export const PhotoScreen = lazy(photo);

/** What opens over the day. */
export async function fetchMendScreens(): Promise<void> {
  for (const fetchOne of [mend, snag, photo]) await fetchOne().catch(() => null);
}

/** A miss is tried again when the screen is opened. */
export async function fetchStopScreens(): Promise<void> {
  for (const fetchOne of [checks, snags, setting, newSnag, sign, bring, snag, asFound, photo]) {
    await fetchOne().catch(() => null);
  }
}
