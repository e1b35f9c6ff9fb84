import { askServer } from '@/components/shell/ask-server';
import type {
  MarkConsentInput,
  SendTestInput,
  SetLanguageInput,
  TestAnswer,
  WriteByHandInput,
  WrittenByHand,
} from '@/lib/contracts/messages';
import type { SaveMessageSettingsInput, SaveWordingInput } from '@/lib/contracts/wordings';
import { apiPaths } from '@/lib/paths';

export const tickOffItem = (itemId: string) =>
  askServer(apiPaths.schedulerItem(itemId), { method: 'DELETE' });

export const writeToCustomer = (body: WriteByHandInput) =>
  askServer<WrittenByHand>(apiPaths.messages(), { body });

export const markConsent = ({ customerId, ...body }: MarkConsentInput) =>
  askServer(apiPaths.customerConsent(customerId), { body });

export const setLanguage = ({ customerId, ...body }: SetLanguageInput) =>
  askServer(apiPaths.customerLanguage(customerId), { method: 'PATCH', body });

export const saveWording = (body: SaveWordingInput) =>
  askServer(apiPaths.wordings(), { method: 'PATCH', body });

export const saveMessageSettings = (body: SaveMessageSettingsInput) =>
  askServer(apiPaths.messageSettings(), { method: 'PATCH', body });

export const sendTest = (body: SendTestInput) =>
  askServer<TestAnswer>(apiPaths.messageTest(), { body });
