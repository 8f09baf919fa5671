import { Button } from '#src/components/ui/button.tsx';
import { Menu, MenuDownload, MenuItem } from '#src/components/ui/menu.tsx';

/** One sheet on paper: this page by the browser, or a PDF with all findings and decisions. */
export function PrintMenu({ recordId }: { recordId: string }) {
  const file = (paper: 'letter' | 'a4') =>
    `/api/records/${encodeURIComponent(recordId)}/sheet.pdf?paper=${paper}`;
  return (
    <Menu trigger={<Button size="small">Print</Button>}>
      <MenuItem onSelect={() => window.print()}>Print the drawing</MenuItem>
      <MenuDownload href={file('letter')}>Sheet as PDF, US Letter</MenuDownload>
      <MenuDownload href={file('a4')}>Sheet as PDF, A4</MenuDownload>
    </Menu>
  );
}
