/** Timbers, and things made of them: the first half of a joining word. */
export const timbers: readonly string[] = (
  'alder apple ash aspen balsa bamboo beech birch bough box branch bramble cedar cherry chestnut ' +
  'cypress elder elm fir gorse hazel heather hickory holly hornbeam ivy juniper laburnum larch ' +
  'laurel lime linden maple medlar mulberry myrtle oak olive osier pear pine plane plum poplar ' +
  'quince reed rowan rush sallow spruce sycamore teak thorn walnut whitebeam willow yew'
).split(' ');

/** Tools, and parts of moving things: the second half. */
export const tools: readonly string[] = (
  'adze anvil arbor auger awl axle bellows bench bobbin bodkin brace bradawl burnisher caliper cam ' +
  'capstan chalk chisel clamp cog compass crank dial dowel drill eccentric file follower gauge ' +
  'gimlet gouge hammer handle hinge hook jig keel kettle ladle lantern lathe lever mallet marker ' +
  'mortise needle oar peg pestle pinion pivot plane plumb pulley punch quill rasp ratchet rebate ' +
  'reel rivet router ruler saw scraper screw shuttle sickle spanner spindle spokeshave square ' +
  'string tenon thimble tiller toggle trammel treadle trowel tumbler vice wedge wheel winch'
).split(' ');
