import { z } from 'zod';
import { designSchema } from './design';
import { houseSchema } from './house';
import { pricesSchema } from './prices';

export const numericsSchema = z.object({
  theta: z.number().min(0.02).max(0.9).default(0.5).meta({
    label: 'Step θ',
    help: 'Sub-step in layer flushes; 0.5 by default, 0.25 for accurate runs.',
  }),
  skyModel: z.enum(['isotropic', 'hay-davies', 'hdkr', 'perez']).default('hdkr').meta({ label: 'Sky model' }),
});

/** A house, one design for it and its prices: all that a run needs beside the weather year. */
export const designFileSchema = z.object({
  format: z.literal('tepidarium design').default('tepidarium design'),
  version: z.literal(1).default(1),
  house: houseSchema,
  design: designSchema,
  prices: pricesSchema,
  numerics: numericsSchema.default({ theta: 0.5, skyModel: 'hdkr' }),
});

export type DesignFile = z.infer<typeof designFileSchema>;
