import { ScrollView, StyleSheet } from 'react-native';

import { Icon } from '../ui/Icon';
import { Press } from '../ui/Press';
import { Text } from '../ui/Text';
import { color, radius } from '../ui/tokens';
import { sameTool, TOOLS, type RoomTool } from './room-tools';

export interface ToolBarProps {
  readonly tool: RoomTool;
  readonly onTool: (tool: RoomTool) => void;
}

/** The tools at the foot of the canvas; the one in hand is lit. */
export function ToolBar({ tool, onTool }: ToolBarProps) {
  return (
    <ScrollView horizontal role="toolbar" aria-label="Tools" style={styles.bar} contentContainerStyle={styles.row}>
      {TOOLS.map((look) => {
        const on = sameTool(look.tool, tool);
        return (
          <Press
            key={look.label}
            style={[styles.tool, on && styles.on]}
            hoverGround={color.chalkT}
            aria-pressed={on}
            onPress={() => onTool(look.tool)}
          >
            <Icon name={look.icon} tone={on ? 'chalk' : 'ink'} />
            <Text kind="labelSmall" tone={on ? 'chalk' : 'ink'} lines={1}>
              {look.label}
            </Text>
          </Press>
        );
      })}
    </ScrollView>
  );
}

const styles = StyleSheet.create({
  bar: {
    flexGrow: 0,
    flexShrink: 1,
    borderWidth: 1,
    borderColor: color.line,
    borderRadius: radius.card,
    backgroundColor: color.card,
  },
  row: { padding: 4 },
  tool: {
    width: 76,
    minHeight: 56,
    alignItems: 'center',
    justifyContent: 'center',
    gap: 3,
    outlineOffset: -3,
  },
  on: { backgroundColor: color.chalkT },
});
