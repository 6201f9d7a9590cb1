import type { Layout } from '../core/layout';
import type { ShopSettings } from '../core/settings';
import { CONNECTOR_SIZES, withSize } from './connector-sizes';

/** The shop's settings with the screw and the connector that this job was given. A name that is not in the table is left. */
export function jobSettings({ fixing }: Pick<Layout, 'fixing'>, settings: ShopSettings): ShopSettings {
  const size = CONNECTOR_SIZES.find(({ name }) => name === fixing.connector);
  const screw = fixing.screw ?? 0;
  if (!size && screw <= 0) return settings;
  return {
    ...settings,
    ...(size && { connectors: withSize(settings.connectors, size) }),
    ...(screw > 0 && { screws: { ...settings.screws, lengths: [screw] } }),
  };
}
