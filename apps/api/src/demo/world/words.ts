/** Invented names and the sentences that offices write about sites. */

export const familyNames = [
  'Abernal',
  'Bexley',
  'Cordray',
  'Dunmire',
  'Ellwand',
  'Farrow',
  'Gantry',
  'Hobart',
  'Ishwood',
  'Jessamy',
  'Kestrel',
  'Lindqvale',
  'Morrow',
  'Nettles',
  'Okafield',
  'Prewitt',
  'Quillen',
  'Rowsby',
  'Sandoval',
  'Thackery',
  'Umber',
  'Vantongeren',
  'Whitlow',
  'Yarrow',
  'Zellner',
  'Arkwell',
  'Brandywine',
  'Cresswell',
  'Dellamore',
  'Eastlake',
] as const;

export const streets = [
  'Cottonwood Lane',
  'Plover Street',
  'Sagebrush Court',
  'Mill Race Road',
  'Third Street',
  'Larkspur Drive',
  'Granary Road',
  'Antelope Way',
  'Bluestem Avenue',
  'Orchard Hill',
  'Kestrel Loop',
  'Depot Street',
  'Ridge View',
] as const;

export const accessNotes = [
  'Dog in the back yard: ring first.',
  'Shutoff is inside; key with the neighbour at the blue door.',
  'Gate sticks: lift, then push.',
  'Park on the street, not on the new driveway.',
  'Nobody home before 9; basement door is open.',
  'Call from the truck, the bell is broken.',
  'Low branches on the north side, mind the hose.',
  'Controller is behind the freezer in the garage.',
] as const;

export const planNotes = [
  'Backflow assembly moved in spring: see new place.',
  'Customer asks for the crew to close the shutoff gently.',
  'New patio since last year; zone 3 was shortened.',
  'Take the long hose.',
  'Do first: crew has a school after this.',
] as const;

export const lastYearNotes = [
  'Last zone needed a third cycle.',
  'Test cock 2 is stiff; worked in slowly.',
  'Valve box by the walk is full of gravel.',
  'One head on the slope weeps; told the customer.',
  'Shutoff handle is loose, turn with the second hand.',
  'Quiet site, no surprises.',
  'Air connection had no cap; fitted a new one.',
  'Wasps in the controller: knock first.',
  'Drip zone takes longer than it looks.',
] as const;
