import { DropdownMenu } from 'radix-ui';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { Glyph } from '#src/components/ui/glyph.tsx';
import { classNames } from '#src/lib/class-names.ts';

type MenuProps = {
  /** One element that takes a ref: a Button. */
  readonly trigger: ReactNode;
  readonly align?: 'start' | 'end';
  readonly children: ReactNode;
};

export function Menu({ trigger, align = 'end', children }: MenuProps) {
  return (
    <DropdownMenu.Root modal={false}>
      <DropdownMenu.Trigger asChild>{trigger}</DropdownMenu.Trigger>
      <DropdownMenu.Portal>
        <DropdownMenu.Content
          align={align}
          sideOffset={6}
          collisionPadding={8}
          className="z-40 max-h-(--radix-dropdown-menu-content-available-height) min-w-52 overflow-y-auto border border-ink bg-sheet py-1 text-ink"
        >
          {children}
        </DropdownMenu.Content>
      </DropdownMenu.Portal>
    </DropdownMenu.Root>
  );
}

const ITEM =
  'flex min-h-8 cursor-pointer items-center gap-2.5 px-3.5 outline-none select-none data-disabled:cursor-default data-disabled:text-muted data-highlighted:bg-sunk pointer-coarse:min-h-11';

export function MenuItem({ onSelect, disabled, children }: MenuItemProps) {
  return (
    <DropdownMenu.Item className={ITEM} onSelect={onSelect} disabled={disabled}>
      {children}
    </DropdownMenu.Item>
  );
}
type MenuItemProps = {
  readonly onSelect: () => void;
  readonly disabled?: boolean;
  readonly children: ReactNode;
};

export function MenuLink({ to, active, children }: { to: string; active?: boolean; children: ReactNode }) {
  return (
    <DropdownMenu.Item
      asChild
      className={classNames(ITEM, active && 'border-l-[3px] border-accent font-semibold')}
    >
      <Link to={to} aria-current={active ? 'page' : undefined}>
        {children}
      </Link>
    </DropdownMenu.Item>
  );
}

/** A file of the server's, streamed straight to the disk. */
export function MenuDownload({ href, children }: { href: string; children: ReactNode }) {
  return (
    <DropdownMenu.Item asChild className={ITEM}>
      <a href={href} download>
        {children}
      </a>
    </DropdownMenu.Item>
  );
}

type ChoiceProps<T extends string> = {
  readonly label: string;
  readonly value: T;
  readonly options: readonly { readonly value: T; readonly label: string }[];
  readonly onChange: (value: T) => void;
};

/** One of several, with the menu left open so that the effect is seen. */
export function MenuChoice<T extends string>({ label, value, options, onChange }: ChoiceProps<T>) {
  return (
    <DropdownMenu.RadioGroup
      value={value}
      onValueChange={(next) => {
        const option = options.find((one) => one.value === next);
        if (option) onChange(option.value);
      }}
    >
      <DropdownMenu.Label className="px-3.5 pt-2 pb-0.5 text-small text-muted">{label}</DropdownMenu.Label>
      {options.map((option) => (
        <DropdownMenu.RadioItem
          key={option.value}
          value={option.value}
          className={classNames(ITEM, 'pl-9')}
          onSelect={(event) => event.preventDefault()}
        >
          <DropdownMenu.ItemIndicator className="-ml-6">
            <Glyph name="tick" className="text-ink" />
          </DropdownMenu.ItemIndicator>
          {option.label}
        </DropdownMenu.RadioItem>
      ))}
    </DropdownMenu.RadioGroup>
  );
}

type CheckProps = {
  readonly checked: boolean;
  readonly onChange: (checked: boolean) => void;
  readonly children: ReactNode;
};

export function MenuCheck({ checked, onChange, children }: CheckProps) {
  return (
    <DropdownMenu.CheckboxItem
      checked={checked}
      onCheckedChange={onChange}
      onSelect={(event) => event.preventDefault()}
      className={classNames(ITEM, 'pl-9')}
    >
      <DropdownMenu.ItemIndicator className="-ml-6">
        <Glyph name="tick" className="text-ink" />
      </DropdownMenu.ItemIndicator>
      {children}
    </DropdownMenu.CheckboxItem>
  );
}

export function MenuRule() {
  return <DropdownMenu.Separator className="my-1 border-t border-hairline" />;
}

export function MenuNote({ children }: { children: ReactNode }) {
  return <DropdownMenu.Label className="px-3.5 py-1.5">{children}</DropdownMenu.Label>;
}
