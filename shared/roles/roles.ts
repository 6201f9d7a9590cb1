export const ROLES = ['owner', 'designer', 'installer', 'shop_hand'] as const;

export type Role = (typeof ROLES)[number];

export const ROLE_NAMES: Readonly<Record<Role, string>> = {
  owner: 'Owner',
  designer: 'Designer',
  installer: 'Installer',
  shop_hand: 'Shop hand',
};

const EVERYBODY = ROLES;

/** Who may do what: the one table that the server enforces and the screens hide by. */
export const PERMISSIONS = {
  'job.see': EVERYBODY,
  'job.edit': ['owner', 'designer', 'installer'],
  'layout.edit': ['owner', 'designer', 'installer'],
  'plan.make': EVERYBODY,
  'revision.freeze': ['owner', 'designer', 'installer'],
  'revision.sign': ['owner', 'designer'],
  'sheet.print': EVERYBODY,
  'work.tick': EVERYBODY,
  'cutting.mark': ['owner', 'shop_hand'],
  'rack.see': EVERYBODY,
  'rack.edit': ['owner', 'shop_hand'],
  'job.fit': ['owner', 'designer', 'installer'],
  'photo.add': EVERYBODY,
  'comment.add': EVERYBODY,
  'price.see': ['owner', 'designer'],
  'price.edit': ['owner'],
  'stock.see': ['owner', 'designer', 'shop_hand'],
  'stock.report': ['owner', 'shop_hand'],
  'stock.edit': ['owner'],
  'crew.see': EVERYBODY,
  'crew.edit': ['owner'],
  'shop.see': EVERYBODY,
  'shop.edit': ['owner'],
} as const satisfies Record<string, readonly Role[]>;

export type Permission = keyof typeof PERMISSIONS;

/** Whether somebody with this role may do this. */
export function may(role: Role, permission: Permission): boolean {
  return (PERMISSIONS[permission] as readonly Role[]).includes(role);
}
