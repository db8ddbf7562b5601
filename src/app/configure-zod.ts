import { z } from 'zod';

// Zod probes for eval unless told not to, and our content security policy reports that. Imported first.
z.config({ jitless: true });
