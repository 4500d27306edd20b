import { registerEnumType } from '@nestjs/graphql';

export enum CostAxis {
  CAPITAL = 'CAPITAL',
  LIFE_CYCLE = 'LIFE_CYCLE',
}

registerEnumType(CostAxis, {
  name: 'CostAxis',
  description: 'Which cost a search keeps low. The ceiling is on capital.',
});
