/** Names under which the phone keeps what is half done. */
export const habitsKey = 'habits';
export const draftKey = (roomId: string): string => `pad:${roomId}`;
export const sketchKey = (roomId: string): string => `sketch:${roomId}`;
export const afterKey = (roomId: string): string => `after:${roomId}`;
