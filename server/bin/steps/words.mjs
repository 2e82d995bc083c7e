import { randomInt } from 'node:crypto';

// Short everyday words: 256 of them, so that each adds eight bits.
const words = `
acorn alder amber anchor anvil apple apron arch ashes aspen attic autumn
badger baker bamboo barge barley barn basin basket beacon beaver bell bench
berry birch biscuit blanket bonfire bottle boulder bracket bramble branch brass bread
breeze brick bridge brook broom bucket butter button cabin canal candle canoe
canvas carrot castle cedar cellar chalk cheese cherry chimney cider cinder circle
clay cliff clock clover coast cobble comet compass copper coral corner cotton
cove cradle crane cricket crown crumb cupboard curlew curtain cushion daisy dapple
dawn deck dew ditch dolphin donkey dove drawer drift drum dune dusk
eagle easel echo elbow elder ember engine falcon fern ferry fiddle field
finch flagon flannel flint flour flute fog forest forge fossil fountain fox
frost garden garlic garnet gate ginger glacier glove goose gorse granite grape
gravel grove gull hammer hammock harbour harvest hatch hazel heather hedge heron
hill hinge holly honey horn hour island ivory ivy jacket jar jetty
jigsaw juniper kayak kettle kite kitten ladder lagoon lake lamp lantern larch
lark lattice laurel lawn leaf ledge lemon lichen lilac linen lobster loom
lupin magnet mallet maple marble marsh meadow mellow mill mint mirror mist
mitten moor morning moss mussel mustard needle nettle nutmeg oak oar oatmeal
olive onion orbit orchard otter oven owl paddle paint parcel parsley pasture
pebble pencil pepper petal pewter pigeon pillow pine plank plaster plough plum
pocket pond poplar poppy porch potter pulley pumpkin quarry quill quilt rabbit
raft ramp raven reed ribbon ridge rivet rope saddle sail satchel saucer
scarf shell shore silver
`
  .trim()
  .split(/\s+/);

const wordsInPassphrase = 5;

export const newPassphrase = () =>
  Array.from({ length: wordsInPassphrase }, () => words[randomInt(words.length)]).join(' ');
