import type { RefObject } from 'react';
import { ActionList, ActionMenu } from '@primer/react';
import type { MenuGroup, MenuProps } from './menu';

interface MenuOverlayProps extends Required<Pick<MenuProps, 'groups' | 'width' | 'side'>> {
  labelledBy: string;
  anchorRef: RefObject<HTMLButtonElement | null>;
  onClose: () => void;
}

/** The open part of a `<Menu>`. */
export function MenuOverlay({ groups, width, side, labelledBy, anchorRef, onClose }: MenuOverlayProps) {
  return (
    <ActionMenu open onOpenChange={(open) => !open && onClose()} anchorRef={anchorRef}>
      <ActionMenu.Overlay width={width} side={side} aria-labelledby={labelledBy}>
        <ActionList>
          {groups.map((group, index) => [
            index > 0 && <ActionList.Divider key={`${group.id}-line`} />,
            <Group key={group.id} {...group} />,
          ])}
        </ActionList>
      </ActionMenu.Overlay>
    </ActionMenu>
  );
}

function Group({ heading, items }: MenuGroup) {
  const choices = items.some(({ selected }) => selected !== undefined);
  return (
    <ActionList.Group selectionVariant={choices ? 'single' : false}>
      {heading && <ActionList.GroupHeading>{heading}</ActionList.GroupHeading>}
      {items.map((item) => (
        <ActionList.Item key={item.id} selected={item.selected} onSelect={item.onSelect}>
          {item.name}
          {item.detail && <ActionList.Description variant="block">{item.detail}</ActionList.Description>}
        </ActionList.Item>
      ))}
    </ActionList.Group>
  );
}
