import type { DataColumn } from '#src/components/table/columns.ts';
import { Button } from '#src/components/ui/button.tsx';
import { Menu, MenuCheck } from '#src/components/ui/menu.tsx';

type Props<Row> = {
  readonly columns: readonly DataColumn<Row>[];
  readonly isVisible: (id: string) => boolean;
  readonly toggle: (id: string, shown: boolean) => void;
};

export function ColumnChooser<Row>({ columns, isVisible, toggle }: Props<Row>) {
  return (
    <Menu trigger={<Button size="small">Columns</Button>}>
      {columns
        .filter((column) => !column.main)
        .map((column) => (
          <MenuCheck
            key={column.id}
            checked={isVisible(column.id)}
            onChange={(shown) => toggle(column.id, shown)}
          >
            {column.title}
          </MenuCheck>
        ))}
    </Menu>
  );
}
