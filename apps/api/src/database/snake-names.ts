import { DefaultNamingStrategy } from 'typeorm';

const snake = (name: string) => name.replace(/([a-z0-9])([A-Z])/g, '$1_$2').toLowerCase();

/** Columns are written as SQL writes them: wearLimitPct is wear_limit_pct. */
export class SnakeNames extends DefaultNamingStrategy {
  override columnName(propertyName: string, customName: string | undefined): string {
    return customName ?? snake(propertyName);
  }
}
