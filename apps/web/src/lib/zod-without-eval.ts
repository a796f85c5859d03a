import { config } from 'zod';

// The content security policy forbids eval, and zod would probe for it when the first schema is made.
config({ jitless: true });
