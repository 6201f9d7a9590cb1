import { useId, useRef, useState, type KeyboardEvent } from 'react';
import { StyleSheet, View } from 'react-native';

import { useBackCloses } from './back-layers';
import { useFocusTrap } from './focus-trap';
import { Icon } from './Icon';
import { IconButton } from './IconButton';
import type { IconName } from './icon-shapes';
import { Press } from './Press';
import { Text } from './Text';
import { color, radius, space } from './tokens';
import { nextIndex } from './use-radio-keys';
import { webStyle } from './web-style';

export interface MenuItem {
  readonly key: string;
  readonly label: string;
  readonly icon?: IconName;
  readonly danger?: boolean;
  readonly disabled?: boolean;
  readonly onPress: () => void;
}

export interface MenuListProps {
  readonly label: string;
  readonly items: readonly MenuItem[];
  readonly onClose: () => void;
}

/** The open list; place it where the long press was. Arrows move, Enter chooses, Escape and Back close. */
export function MenuList({ label, items, onClose }: MenuListProps) {
  const list = useRef<View>(null);
  useFocusTrap(list, true);
  useBackCloses(true, onClose);
  const onKeyDown = (event: KeyboardEvent<HTMLElement>) => {
    if (event.key === 'Escape' || event.key === 'Tab') {
      event.preventDefault();
      event.stopPropagation();
      onClose();
      return;
    }
    const rows = Array.from(event.currentTarget.querySelectorAll<HTMLElement>('[role=menuitem]'));
    const at = rows.indexOf(document.activeElement as HTMLElement);
    const next = nextIndex(event.key, at, rows.length, (index) => items[index]?.disabled === true);
    if (next === null) return;
    event.preventDefault();
    rows[next]?.focus();
  };
  return (
    <>
      <View style={[styles.cover, styles.fixed]} onClick={onClose} aria-hidden />
      <View
        ref={list}
        role="menu"
        aria-label={label}
        tabIndex={-1}
        onKeyDown={onKeyDown}
        style={styles.list}
        dataSet={{ ring: 'none' }}
      >
        {items.map((item, index) => {
          const tone = item.disabled ? 'ink2' : item.danger ? 'red' : 'ink';
          return (
            <Press
              key={item.key}
              role="menuitem"
              tabIndex={-1}
              dataSet={index === 0 ? { autofocus: 'true' } : undefined}
              disabled={item.disabled}
              onPress={() => {
                onClose();
                item.onPress();
              }}
              hoverGround={color.chalkT}
              style={styles.item}
            >
              {item.icon && <Icon name={item.icon} tone={tone} size={22} />}
              <Text kind="body" tone={tone}>
                {item.label}
              </Text>
            </Press>
          );
        })}
      </View>
    </>
  );
}

export interface MoreMenuProps {
  /** "More for wall B". */
  readonly label: string;
  readonly items: readonly MenuItem[];
  readonly icon?: IconName;
  readonly framed?: boolean;
}

/** A "More" button and its list under it. */
export function MoreMenu({ label, items, icon = 'more', framed }: MoreMenuProps) {
  const [open, setOpen] = useState(false);
  const id = useId();
  return (
    <View style={styles.anchor} id={id}>
      <IconButton icon={icon} label={label} framed={framed} expanded={open} onPress={() => setOpen(true)} />
      {open && (
        <View style={styles.under}>
          <MenuList label={label} items={items} onClose={() => setOpen(false)} />
        </View>
      )}
    </View>
  );
}

const styles = StyleSheet.create({
  anchor: { position: 'relative' },
  under: { position: 'absolute', top: '100%', right: 0, zIndex: 150 },
  cover: { inset: 0, zIndex: 149 },
  fixed: webStyle({ position: 'fixed' }),
  list: {
    zIndex: 150,
    minWidth: 200,
    paddingVertical: space.xs,
    borderWidth: 1.5,
    borderColor: color.ink,
    borderRadius: radius.control,
    backgroundColor: color.card,
    ...webStyle({ width: 'max-content', maxWidth: 320 }),
  },
  item: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.m,
    minHeight: 48,
    paddingHorizontal: space.l,
    outlineOffset: -3,
  },
});
