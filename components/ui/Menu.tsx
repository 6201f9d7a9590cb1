import { useLayoutEffect, useRef, useState, type KeyboardEvent } from 'react';
import { createPortal } from 'react-dom';
import { StyleSheet, View } from 'react-native';

import { useBackCloses } from './back-layers';
import { useFocusTrap } from './focus-trap';
import { Icon } from './Icon';
import { IconButton } from './IconButton';
import type { IconName } from './icon-shapes';
import { placeMenu, type Box } from './place-menu';
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
  /** The button it belongs to, or the spot of a long press, px of the window. */
  readonly anchor: Box;
  readonly onClose: () => void;
}

/** The open list beside its anchor. Arrows move, Enter chooses, Escape, Tab and Back close. */
export function MenuList(props: MenuListProps) {
  return createPortal(<OpenMenu {...props} />, document.body);
}

function OpenMenu({ label, items, anchor, onClose }: MenuListProps) {
  const list = useRef<View>(null);
  useFocusTrap(list, true);
  useBackCloses(true, onClose);
  useLayoutEffect(() => {
    const element = list.current as unknown as HTMLElement;
    const size = { width: element.offsetWidth, height: element.offsetHeight };
    const place = placeMenu(anchor, size, { width: window.innerWidth, height: window.innerHeight });
    element.style.left = `${place.left}px`;
    element.style.top = `${place.top}px`;
  });
  return (
    <>
      <View style={[styles.cover, styles.fixed]} onClick={onClose} aria-hidden />
      <View
        ref={list}
        role="menu"
        aria-label={label}
        tabIndex={-1}
        onKeyDown={(event) => onMenuKey(event, items, onClose)}
        style={[styles.list, styles.fixed]}
        dataSet={{ ring: 'none' }}
      >
        {items.map((item, index) => (
          <MenuRow key={item.key} item={item} first={index === 0} onClose={onClose} />
        ))}
      </View>
    </>
  );
}

function onMenuKey(event: KeyboardEvent<HTMLElement>, items: readonly MenuItem[], onClose: () => void): void {
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
}

interface MenuRowProps {
  readonly item: MenuItem;
  readonly first: boolean;
  readonly onClose: () => void;
}

function MenuRow({ item, first, onClose }: MenuRowProps) {
  const tone = item.disabled ? 'ink2' : item.danger ? 'red' : 'ink';
  return (
    <Press
      role="menuitem"
      tabIndex={-1}
      dataSet={first ? { autofocus: 'true' } : undefined}
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
}

export interface MoreMenuProps {
  /** "More for wall B". */
  readonly label: string;
  readonly items: readonly MenuItem[];
  readonly icon?: IconName;
  readonly framed?: boolean;
}

/** A "More" button and its list. */
export function MoreMenu({ label, items, icon = 'more', framed }: MoreMenuProps) {
  const button = useRef<View>(null);
  const [anchor, setAnchor] = useState<Box | null>(null);
  const open = () => setAnchor((button.current as unknown as HTMLElement).getBoundingClientRect());
  return (
    <View ref={button}>
      <IconButton icon={icon} label={label} framed={framed} expanded={anchor !== null} onPress={open} />
      {anchor && <MenuList label={label} items={items} anchor={anchor} onClose={() => setAnchor(null)} />}
    </View>
  );
}

const styles = StyleSheet.create({
  cover: { inset: 0, zIndex: 249 },
  fixed: webStyle({ position: 'fixed' }),
  list: {
    zIndex: 250,
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
