/** Plain words of four to seven letters from garden, kitchen and cellar; our own list. */
const WORDS = `
acorn almond amber anchor anvil apple apron arch aspen attic autumn baker banjo barley barn basil basket beacon
beaker beech beet bellow bench berry birch biscuit bishop blanket bloom border bottle boulder bramble branch brass
bread brick bridge brook broom bucket burrow butter button cabbage cable candle canvas carbon cargo carrot cashew
cedar cellar cherry chess chest chimney chive cider cinder circle clamp clay clover cobalt cobble cocoa comet copper
coral corner cotton cradle crane crater crayon cricket crumb crystal cumin curtain cushion dahlia daisy damson dawn
deck denim dial dill donkey drawer drift drum dune eagle earth easel echo elbow elder ember engine fabric falcon
feather fennel ferry fiddle field finch flagon flask flint flour flute forest forge fossil fountain fox garden garlic
garnet gate ginger glacier glass globe glove goose gravel grove guitar hammer harbour harvest hazel hedge helmet
heron hinge hollow honey hopper horizon iris island ivory jacket jasmine jigsaw juniper kelp kernel kettle kiln
kitten ladder ladle lantern larch lark laurel lavender leaf ledger leek lemon lentil linen lobster locket loft
magnet mallet maple marble meadow melon mill mint mirror mitten mosaic mustard napkin nectar needle nettle nickel
nutmeg oak oatmeal olive onion orbit orchard otter oven oyster paddle panther paper parcel parsley pebble pepper
pigeon pillow pine planet plank plaster plum pocket pond poppy potter pumpkin quarry quartz quilt radish rafter
raven reed ribbon river robin rocket rope saddle saffron salmon`;

export const passphraseWords: readonly string[] = WORDS.trim().split(/\s+/);

/** Words drawn by lot, each as likely as the other. */
export function suggestPassphrase(count = 6): string {
  const list = passphraseWords;
  // Values past the last whole round are drawn again, or the first words would come up more often.
  const fair = Math.floor(65_536 / list.length) * list.length;
  const words: string[] = [];
  while (words.length < count) {
    const [value = 0] = crypto.getRandomValues(new Uint16Array(1));
    if (value < fair) words.push(list[value % list.length]!);
  }
  return words.join(' ');
}
