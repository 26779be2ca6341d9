import { z } from 'zod';

// zod would otherwise try whether it may write code at run time; the content policy says no, aloud.
z.config({ jitless: true });
