import { saveMessageSettingsInput } from '@/lib/contracts/wordings';
import { handle } from '@/server/base/handle';
import { saveMessageSettings } from '@/server/messages/save-message-settings';

export const PATCH = handle(saveMessageSettingsInput, saveMessageSettings);
