import { config } from 'zod';

// The pages' content policy forbids code from text; told so before the first schema is made, zod does not try.
config({ jitless: true });
