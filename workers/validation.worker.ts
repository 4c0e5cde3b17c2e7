import { validationSteps } from '@/lib/reference/validation';

/* The checks in the visitor's own browser: one message for each piece of work; the page ends the worker to cancel. */

for (const step of validationSteps()) postMessage(step);
