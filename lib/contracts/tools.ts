/** The shop's measuring tools and how far each may be off, as its maker says. */
import { z } from 'zod';
import { tool } from './wall-book';

const name = z.string().trim().min(1, 'Give the tool a name.').max(60);

export const addToolInput = z.object({ name, spec: tool.shape.spec });
export type AddToolInput = z.infer<typeof addToolInput>;

/** What a tool reads does not change: readings hang on it. */
export const changeToolInput = addToolInput.extend({ toolId: z.uuid() });
export type ChangeToolInput = z.infer<typeof changeToolInput>;
