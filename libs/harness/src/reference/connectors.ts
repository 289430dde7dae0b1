import type { Connector } from './connector';
import { iso11446, iso1724, iso3732 } from './iso12Volt';
import { iso1185, iso12098 } from './iso24Volt';
import { saeJ560 } from './saeJ560';

/** Every connector whose contacts are known well enough to show. ISO 3731 (24S) is not. */
export const CONNECTORS: readonly Connector[] = [
  saeJ560,
  iso1724,
  iso3732,
  iso11446,
  iso12098,
  iso1185,
];

const byName = new Map(
  CONNECTORS.flatMap((connector) =>
    [connector.name, ...connector.aliases].map((name) => [plain(name), connector]),
  ),
);

/** The connector that a plan's `supply.connector` names, whatever its case, spaces and hyphens: `iso-11446`, `12N`. */
export function connectorByName(name: string): Connector | undefined {
  return byName.get(plain(name));
}

function plain(name: string): string {
  return name.toUpperCase().replace(/[\s_-]/g, '');
}
