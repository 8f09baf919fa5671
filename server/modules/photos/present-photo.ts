import type { Photo } from '#shared/generated/api-types.ts';
import { may, type Ability } from '#shared/permissions/ability.ts';
import { distanceFt } from './distance-ft.ts';
import type { PhotoDbRow } from './photo-select.ts';

export function presentPhoto(row: PhotoDbRow, viewer: { ability: Ability }): Photo {
  const open =
    row.newest_status === 'draft' || row.newest_status === 'checking' || row.newest_status === 'checked';
  const handIn = open && may(viewer.ability, 'hand-in', 'Photo', { contractorId: row.contractor_id });
  return {
    id: row.id,
    fileName: row.file_name,
    sha256: row.sha256,
    lineId: row.line_id,
    structureNumber: row.structure_number,
    view: row.view,
    method: row.method,
    takenAt: row.taken_wall,
    latitude: row.latitude,
    longitude: row.longitude,
    distanceFt: distanceFt(
      { latitude: row.latitude, longitude: row.longitude },
      { latitude: row.line_latitude, longitude: row.line_longitude },
    ),
    width: row.width,
    height: row.height,
    state: !row.prepared ? 'stored' : row.problem === null ? 'ready' : 'unreadable',
    problem: row.problem?.detail ?? null,
    can: handIn ? (row.line_id === null ? ['place'] : ['place', 'take-off']) : [],
  };
}
