import { z } from 'zod';
import { designDocumentSchema } from '#shared/document/design-document.ts';

/** JSON Schema of the design document, for editors and other programs; what may be left out is not required. */
export function designDocumentJsonSchema(): Record<string, unknown> {
  return {
    title: 'Design document',
    description:
      'Lengths in millimetres, positions from the acting edge of the mouth end towards the foot, angles in degrees.',
    ...z.toJSONSchema(designDocumentSchema, { io: 'input', target: 'draft-2020-12' }),
  };
}
