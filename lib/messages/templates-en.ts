/** What a new shop says in English. Texts are plain letters only, and never ask for a word that opts out. */
import type { OccasionTemplates } from './template';

export const templatesEn: OccasionTemplates = {
  booked: {
    sms: '{shop}: your {visit} is booked for {day}. We arrive {window}. Details and changes: {link}',
    subject: 'Your {visit} with {shop}: {day}',
    email: `Hello {customer},

Your {visit} at {address} is booked for {day}. We arrive {window}.

Who comes: {crew}.

See what to clear before we come, add it to your calendar, or ask for another time:
{link}

{shop}
{shopPhone}`,
  },
  'please-confirm': {
    sms: '{shop}: may we come {day}, {window}, for your {visit}? Reply YES, or CHANGE for another time. {link}',
    subject: 'Please confirm: {visit} on {day}',
    email: `Hello {customer},

We plan to come {day}, {window}, for your {visit} at {address}.

Please tell us with one tap that the time suits, or ask for another one:
{link}

{shop}
{shopPhone}`,
  },
  'day-before': {
    sms: '{shop}: a reminder that we come {day}, {window}, for your {visit}. What to clear: {link}',
    subject: 'A reminder: {visit} on {day}',
    email: `Hello {customer},

A reminder that we come {day}, {window}, for your {visit} at {address}.

What to clear before we come, and how to reach us:
{link}

{shop}
{shopPhone}`,
  },
  'on-my-way': {
    sms: '{shop}: we are on the way and arrive {window}. Questions: {shopPhone}',
    subject: 'On the way: {visit} today',
    email: `Hello {customer},

We are on the way for your {visit} at {address} and arrive {window}.

Who comes: {crew}.

{link}

{shop}
{shopPhone}`,
  },
  'running-late': {
    sms: '{shop}: sorry, we are about {minutesLate} minutes late. We now arrive {window}. Questions: {shopPhone}',
    subject: 'We are running late',
    email: `Hello {customer},

We are sorry: we are about {minutesLate} minutes late for your {visit}. We now arrive {window}.

{link}

{shop}
{shopPhone}`,
  },
  moved: {
    sms: '{shop}: your {visit} moves from {oldDay} to {day}, {window}. If that does not suit: {link}',
    subject: 'Moved: your {visit} is now on {day}',
    email: `Hello {customer},

Your {visit} at {address} moves from {oldDay}, {oldWindow}, to {day}. We arrive {window}.

If that does not suit, ask for another time:
{link}

{shop}
{shopPhone}`,
  },
  'called-off': {
    sms: '{shop}: your {visit} on {day} is called off. We will talk to you about a new time. Questions: {shopPhone}',
    subject: 'Called off: {visit} on {day}',
    email: `Hello {customer},

Your {visit} on {day} at {address} is called off. {reason}

We will talk to you about a new time. You reach us at {shopPhone}.

{shop}`,
  },
  done: {
    sms: '{shop}: your {visit} is done. Thank you. Your copy: {link}',
    subject: 'Done: your {visit}',
    email: `Hello {customer},

Your {visit} at {address} is done. Thank you.

Your copy, and anything that is still open:
{link}

{shop}
{shopPhone}`,
  },
};
