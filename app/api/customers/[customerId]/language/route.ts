import { setLanguageInput } from '@/lib/contracts/messages';
import { handle } from '@/server/base/handle';
import { setLanguage } from '@/server/messages/set-language';

export const PATCH = handle(setLanguageInput, setLanguage);
