import { createContext, use } from 'react';
import type { TextLocale } from '@/lib/time/text-locale';

/** How the office of this shop writes days and times. */
export const DiaryLocale = createContext<TextLocale>({ language: 'en', region: 'US' });

export const useDiaryLocale = (): TextLocale => use(DiaryLocale);
