import type { LucideIcon } from 'lucide-react';
import { ChevronDown } from 'lucide-react';
import { DropdownMenu } from 'radix-ui';
import { Fragment } from 'react';
import { Button, type ButtonKind } from './Button';

export interface MenuItem {
  word: string;
  icon?: LucideIcon;
  onSelect?: () => void;
  href?: string;
  disabled?: boolean;
  destructive?: boolean;
  /** A line above this item parts it from those before. */
  apart?: boolean;
}

interface MenuProps {
  word: string;
  icon?: LucideIcon;
  kind?: ButtonKind;
  small?: boolean;
  items: readonly MenuItem[];
}

/** A button that opens a list of acts. */
export function Menu({ word, icon, kind, small, items }: MenuProps) {
  return (
    <DropdownMenu.Root modal={false}>
      <DropdownMenu.Trigger asChild>
        <Button kind={kind} small={small} icon={icon}>
          {word}
          <ChevronDown size={16} aria-hidden />
        </Button>
      </DropdownMenu.Trigger>
      <DropdownMenu.Portal>
        <DropdownMenu.Content
          align="start"
          sideOffset={6}
          collisionPadding={8}
          className="z-50 min-w-48 rounded-control border border-edge bg-surface p-1 shadow-float"
        >
          {items.map((item) => (
            <Fragment key={item.word}>
              {item.apart && <DropdownMenu.Separator className="my-1 h-px bg-line" />}
              <Item {...item} />
            </Fragment>
          ))}
        </DropdownMenu.Content>
      </DropdownMenu.Portal>
    </DropdownMenu.Root>
  );
}

function Item({ word, icon: Icon, onSelect, href, disabled, destructive }: MenuItem) {
  const inside = (
    <>
      {Icon && <Icon size={16} aria-hidden className="shrink-0" />}
      {word}
    </>
  );
  return (
    <DropdownMenu.Item
      asChild={!!href}
      className="menu-item"
      disabled={disabled}
      onSelect={onSelect}
      data-destructive={destructive || undefined}
    >
      {href ? <a href={href}>{inside}</a> : inside}
    </DropdownMenu.Item>
  );
}
