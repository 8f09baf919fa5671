import type { Kind } from '#shared/records/types.ts';

export type FieldGroup = { readonly title: string; readonly fields: readonly string[] };

const PLACE: FieldGroup = {
  title: 'Place',
  fields: [
    'latitude',
    'longitude',
    'accuracyFt',
    'locateTicket',
    'locateFrom',
    'locateTo',
    'foreman',
    'notes',
  ],
};

/** Measurements in the order in which the work is done; what no group names stands under `Other`. */
export const FIELD_GROUPS: Readonly<Record<Kind, readonly FieldGroup[]>> = {
  set: [
    {
      title: 'Pole',
      fields: [
        'structureNumber',
        'replacesStructure',
        'poleLengthFt',
        'poleClass',
        'poleMaterial',
        'poleSection',
        'buttEnd',
        'wallIn',
        'girthGroundLineIn',
        'girthButtIn',
        'diameterGroundLineIn',
        'diameterButtIn',
        'brandHeightFt',
        'structureUse',
      ],
    },
    {
      title: 'Bore',
      fields: [
        'boreTopIn',
        'boreTopAcrossIn',
        'boreBottomIn',
        'boreBottomAcrossIn',
        'bellIn',
        'bellHeightFt',
        'boreDepthFt',
        'leastGapIn',
        'casing',
      ],
    },
    { title: 'Ground', fields: ['ground', 'rockFromFt', 'slopeRiseIn', 'waterIn', 'waterMeasured'] },
    {
      title: 'Setting',
      fields: [
        'bedMaterial',
        'bedFt',
        'embedmentFt',
        'foamTopBelowGradeIn',
        'backfillOnTop',
        'leanInPer10Ft',
        'leanAzimuthDeg',
        'designRakeInPer10Ft',
        'designRakeAzimuthDeg',
      ],
    },
    { title: 'Clock', fields: ['boredAt', 'setAt', 'letGoAt', 'hardwareAt', 'loadAt'] },
    PLACE,
  ],
  straighten: [
    {
      title: 'Pole',
      fields: [
        'structureNumber',
        'poleLengthFt',
        'poleClass',
        'poleMaterial',
        'poleSection',
        'girthGroundLineIn',
        'diameterGroundLineIn',
        'embedmentFt',
        'embedmentSource',
      ],
    },
    {
      title: 'Lean',
      fields: [
        'leanBeforeInPer10Ft',
        'leanBeforeAzimuthDeg',
        'leanAfterInPer10Ft',
        'leanAfterAzimuthDeg',
        'springbackInPer10Ft',
        'designRakeInPer10Ft',
        'designRakeAzimuthDeg',
      ],
    },
    { title: 'Gap', fields: ['gapAtGradeIn', 'gapAtDepthIn', 'gapDepthFt', 'gapWidthIn', 'waterIn'] },
    { title: 'Clock', fields: ['pulledAt', 'releasedAt', 'reattachedAt'] },
    PLACE,
  ],
  relevel: [
    {
      title: 'Pad',
      fields: ['structureNumber', 'padLengthIn', 'padWidthIn', 'openingLengthIn', 'openingWidthIn'],
    },
    { title: 'Gap', fields: ['gap1In', 'gap2In', 'gap3In', 'gap4In'] },
    {
      title: 'Slope',
      fields: [
        'slopeBeforeAlongInPerFt',
        'slopeBeforeAcrossInPerFt',
        'slopeAfterAlongInPerFt',
        'slopeAfterAcrossInPerFt',
      ],
    },
    { title: 'Clock', fields: ['raisedAt', 'loweredAt', 'releasedAt'] },
    PLACE,
  ],
};
