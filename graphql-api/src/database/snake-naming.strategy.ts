import { DefaultNamingStrategy } from 'typeorm';

/** Columns are snake_case in SQL and camelCase in code. */
export class SnakeNamingStrategy extends DefaultNamingStrategy {
  override columnName(propertyName: string, customName: string | undefined): string {
    return customName ?? propertyName.replace(/[A-Z]/g, (letter) => `_${letter.toLowerCase()}`);
  }
}
