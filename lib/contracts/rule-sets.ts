/** A shop's own copies of rule sets: limits as data, each still saying where it came from. */
import { z } from 'zod';

const limitMm = z.number().min(0).max(500);
const spanMm = z.number().positive();

export const limitInput = z.discriminatedUnion('kind', [
  z.object({ kind: z.literal('constant'), limitMm }),
  z.object({
    kind: z.literal('proportional'),
    limitMm,
    perMm: spanMm.max(20_000),
    mostMm: limitMm.optional(),
  }),
  z.object({
    kind: z.literal('interpolated'),
    points: z
      .array(z.object({ spanMm: spanMm.max(100_000), limitMm }))
      .min(1)
      .max(20),
  }),
  z.object({
    kind: z.literal('bands'),
    rows: z
      .array(z.object({ toMm: spanMm, limitMm }))
      .min(1)
      .max(20),
  }),
]);

export const checkKinds = [
  'wall-straightness',
  'wall-plumb',
  'corner-square',
  'floor-fall',
  'floor-straightness',
  'ceiling-fall',
  'ceiling-straightness',
  'cabinet-plumb-level',
  'cabinet-faces-in-line',
  'cabinet-corners-in-line',
  'cabinet-warp',
  'counter-parallel-to-floor',
  'gap-at-wall',
  'joint-wood',
  'joint-wood-nonwood',
  'pieces-against-whole',
  'aisle',
] as const;

const words = z.string().max(300);

export const ownRuleSet = z.object({
  id: z.string().regex(/^own-[a-z0-9-]{1,40}$/),
  name: z.string().trim().min(1, 'Give the rule set a name.').max(80),
  region: z.enum(['US', 'UK', 'AU', 'EU', 'any']),
  rules: z
    .array(
      z.object({
        check: z.enum(checkKinds),
        limit: limitInput,
        overMm: z.number().positive().max(100_000).nullable(),
        sense: z.enum(['most', 'least']),
        serious: z.object({ limitMm, action: words }).optional(),
        source: words,
        edition: words,
        clause: words,
        address: words,
        action: words,
      }),
    )
    .min(1)
    .max(40),
});
export type OwnRuleSet = z.infer<typeof ownRuleSet>;
