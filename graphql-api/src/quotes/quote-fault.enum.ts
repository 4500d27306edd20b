import { registerEnumType } from '@nestjs/graphql';
import type { QuoteFault as KernelFault } from '@metewand/costing';

/** The kernel's faults under the names of the API; the compiler sees to it that none is missing. */
export const QuoteFault = {
  RUN_OUT: 'RUN_OUT',
  SERVICE_PRICE_MISSING: 'SERVICE_PRICE_MISSING',
  LEAD_TIME_TOO_LONG: 'LEAD_TIME_TOO_LONG',
} as const satisfies { [Fault in KernelFault]: Fault };

registerEnumType(QuoteFault, {
  name: 'QuoteFault',
  description: 'Why a quote cannot be bought by on the decision date.',
});
