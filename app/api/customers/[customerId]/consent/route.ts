import { markConsentInput } from '@/lib/contracts/messages';
import { handle } from '@/server/base/handle';
import { markConsent } from '@/server/messages/mark-consent';

export const POST = handle(markConsentInput, markConsent);
