import { cache } from 'react';
import { readProject } from '@/lib/server/projects';

/** The project of this request, read once for layout and page. */
export const projectOf = cache(readProject);
