/**
 * One whole sentence per reason code. {names} in braces are figures of the answer, written out with their units;
 * a sentence never depends on a figure that its answer might lack.
 */
export const sentences = {
  'eye-to-eye-agrees': 'Eye-to-eye is what the frame’s maker lists.',
  'eye-to-eye-longer':
    'This shock is {shock.size}, longer between the eyes than the {frame.size} that the frame takes.',
  'eye-to-eye-shorter':
    'This shock is {shock.size}, shorter between the eyes than the {frame.size} that the frame takes.',
  'eye-to-eye-from-your-shock':
    'Eye-to-eye agrees with your present shock; the frame’s maker has not confirmed it.',
  'size-no-entry-for-this-bike': 'The frame sheet has no size for your year, frame size or chip position.',
  'size-of-yours-not-settled':
    'The size of your present shock is not settled, and nobody has listed this frame.',
  'size-yours-may-be-changed':
    'Your shock may not be the one the bike was sold with, so its size says nothing certain about the frame.',
  'size-not-in-our-tables': 'One of the two sizes is not in our tables.',
  'stroke-agrees': 'The stroke is what the frame’s maker lists.',
  'stroke-from-your-shock':
    'The stroke agrees with your present shock; the frame’s maker has not confirmed it.',
  'stroke-by-spacer':
    'A travel spacer brings this {shock.size} to the {frame.size} that the frame takes: workshop work.',
  'stroke-longer':
    'The stroke of this {shock.size} is longer than the maker allows; links or wheel may touch at the end.',
  'stroke-shorter':
    'The stroke of this {shock.size} is shorter than the maker lists; the bike would lose travel and end its stroke elsewhere.',
  'stroke-depends-on-frame':
    'Which size is right depends on your year, frame size or chip position, which we have not been told.',
  'mounts-agree': 'Both mounts agree.',
  'mounts-need-an-eyelet': 'The frame needs an eyelet where this shock has something else.',
  'mounts-need-a-trunnion': 'The frame needs a trunnion where this shock has something else.',
  'mounts-need-a-bearing-eye': 'The frame needs a bearing eye where this shock has something else.',
  'mounts-pin-differs': 'The frame’s pin and the eye have different diameters, and no kit helps there.',
  'mounts-bearing-differs': 'The bearing eye has another bolt or width than the frame.',
  'mounts-agree-by-your-reading': 'The mounts agree by a measured reading, to be confirmed at fitting.',
  'mounts-reading-too-coarse': 'The reading of the mount is too coarse to tell; use a caliper.',
  'mounts-not-measured': 'A figure of the frame’s mount is missing.',
  'mounts-not-known': 'One of the frame’s mounts is not known.',
  'hardware-none-needed': 'No mounting hardware is needed.',
  'hardware-kit': 'New mounting hardware is pressed in.',
  'hardware-reuse': 'Your old hardware moves across after inspection, with a press tool.',
  'hardware-several-kits': 'Your reading of the width fits several kits; use a caliper.',
  'hardware-none-on-sale': 'Nobody has hardware of this width and bolt on sale.',
  'hardware-not-measured': 'The width or bolt of the mounting hardware is not known.',
  'spring-type-allowed': 'The frame’s maker allows this kind of spring.',
  'spring-type-air-only': 'The frame’s maker allows air shocks only.',
  'spring-type-coil-only': 'The frame’s maker allows coil shocks only.',
  'spring-type-air-unstated': 'The sheet says nothing against an air shock.',
  'spring-type-coil-unstated': 'The sheet does not say whether a coil is allowed.',
  'coil-on-yoke-not-a-coil': 'An air shock takes the side load of a yoke.',
  'coil-on-yoke-no-yoke': 'There is no yoke.',
  'coil-on-yoke-allowed': 'The frame’s maker allows a coil on this yoke.',
  'coil-on-yoke-refused':
    'The frame’s maker refuses a coil on this yoke: it would load the shaft from the side.',
  'coil-on-yoke-no-word': 'A coil on a yoke needs the frame maker’s word, and there is none.',
  'coil-on-yoke-yoke-not-known':
    'Whether the shock sits on a yoke is not known, and a coil must not without the maker’s word.',
  'spring-rate-not-a-coil': 'No coil to choose.',
  'spring-rate-found': 'A {chosen.rate} spring gives you {chosen.sag} sag.',
  'spring-rate-none-in-window': 'No spring on sale gives you a sag inside the window.',
  'spring-rate-no-spring-on-sale': 'Nobody has a spring on sale that this shock takes at this stroke.',
  'spring-rate-not-known': 'Your spring cannot be worked out until weights, style and travel are known.',
  'pressure-not-an-air-shock': 'No air to fill.',
  'pressure-within-limits': 'Your fill is {computed.pressure}, within the printed limits.',
  'pressure-above-limit': 'Your fill would be {computed.pressure}, above the printed maximum.',
  'pressure-below-limit': 'Your fill would be {computed.pressure}, below the printed minimum.',
  'pressure-above-limit-whatever-inside':
    'Whatever its chambers, your fill would be above the printed maximum.',
  'pressure-start-from-makers-table': 'Its chambers are not published: start from the shock maker’s table.',
  'pressure-no-fill-does-it': 'No pressure gives you a sag inside the window.',
  'pressure-limits-not-printed': 'The shock’s maker prints no pressure limits.',
  'pressure-not-known': 'Your pressure cannot be worked out until weights, style and travel are known.',
  'rider-weight-within': 'You are within the printed weight limit.',
  'rider-weight-over': 'You are above a printed weight limit.',
  'rider-weight-no-limit': 'No weight limit is printed.',
  'rider-weight-not-known': 'A weight limit is printed, and your weight is not known.',
  'rider-weight-basis-not-printed':
    'A weight limit is printed without saying what it counts, and you are close to it.',
  'reservoir-inline': 'An inline shock needs no room for a reservoir.',
  'reservoir-refused': 'The frame’s maker allows inline shocks only.',
  'reservoir-no-position-left': 'The frame’s maker refuses every position the reservoir can be turned to.',
  'reservoir-clears': 'The reservoir keeps {computed.clearance} free through the whole stroke.',
  'reservoir-clears-narrowly': 'The reservoir keeps {computed.clearance} free: enough, not comfortable.',
  'reservoir-touches':
    'The reservoir comes within {computed.clearance} of the {computed.tightestPart}; 3 mm must stay free.',
  'reservoir-word-against-drawing':
    'The maker says it fits, our drawing leaves {computed.clearance} to the {computed.tightestPart}: somebody has to look.',
  'reservoir-movement-not-drawn':
    'A part moves near the shock in a way that nobody has drawn, so the room cannot be told.',
  'reservoir-stated': 'The frame’s maker says that a reservoir fits.',
  'reservoir-room-measured': 'It fits the room you measured.',
  'reservoir-room-too-small': 'It is larger than the room you measured.',
  'reservoir-room-in-doubt': 'The room you measured is too close to tell.',
  'reservoir-word-against-your-room':
    'The maker says it fits, but it is larger than the room you measured: somebody has to look.',
  'reservoir-drawing-against-your-room':
    'Our drawing leaves {computed.clearance}, but it is larger than the room you measured: somebody has to look.',
  'reservoir-drawing-incomplete':
    'Not every part or position near the reservoir is drawn, so its room through the stroke is not known.',
  'reservoir-not-stated': 'Whether there is room for a reservoir is not stated.',
  'diameter-fits': 'It has 2 mm or more on each side in the tunnel.',
  'diameter-too-wide':
    'It is too wide for the tunnel: {shock.diameter} in {frame.tunnel}, and 2 mm must stay free on each side.',
  'diameter-no-wider-than-yours': 'It is no wider than your present shock.',
  'diameter-tunnel-not-known': 'The width of the tunnel is not known.',
  'remote-none': 'No remote asked for, none there.',
  'remote-wish-not-known': 'Whether you want to work the shock from the bar is not answered.',
  'remote-wanted-has-none': 'It cannot be worked from the bar, so it does not do what you asked.',
  'remote-routing-not-known': 'Whether the frame has a way for the cable is not known.',
  'remote-no-routing': 'The frame has no way for the cable; it would have to run outside.',
  'remote-no-lever-on-sale': 'Nobody has a lever on sale that goes with this shock.',
  'remote-your-lever-agrees': 'Your lever goes with this shock.',
  'remote-external-routing': 'Your lever goes with this shock; the cable runs outside the frame.',
  'remote-lever-added': 'A lever that goes with this shock is added.',
  'remote-stays-open': 'Without a cable it simply stays open.',
  'remote-stays-closed': 'Without a lever it stays locked, and nothing on sale holds it open.',
  'remote-held-open': 'A part of its maker holds it open without a lever.',
  'position-free': 'Either end may face the frame.',
  'position-as-ruled': 'It goes in the way round that the maker asks for.',
  'position-against-rule': 'The makers’ rules on which end faces the frame cannot be met.',
  'e-bike-not-one': 'Your bike is no e-bike.',
  'e-bike-approved': 'The shock’s maker allows it on e-bikes.',
  'e-bike-refused': 'The shock’s maker does not allow it on e-bikes.',
  'e-bike-no-word': 'The shock’s maker does not say whether e-bikes are allowed.',
  'e-bike-not-told': 'Whether your bike is an e-bike is not answered.',
  'notices-none': 'No recall or notice is known to us.',
  'notices-remark': 'A maker’s notice should be read first: {notice}.',
  'notices-stop': 'A maker’s recall stands against it: {notice}.',
  'reading-no-conflict': 'Your readings do not contradict the sheet.',
  'reading-conflict':
    'Your readings say {present.size}, the sheet lists {frame.size}: one of them has to be put right.',
  'reading-conflict-confirmed': 'You have confirmed the sheet’s {frame.size} against your readings.',
  'advice-progression-suits-coil': 'The frame’s leverage falls enough to suit a coil.',
  'advice-progression-either': 'The frame’s leverage suits either spring; a coil may use its travel early.',
  'advice-progression-linear':
    'The frame’s leverage hardly changes: an air shock ends its stroke more firmly.',
  'advice-progression-regressive': 'The frame’s leverage rises towards the end: a coil would end hard.',
  'advice-heat': 'A reservoir keeps the damping steadier on long descents.',
  'advice-service-short': 'It asks for service often.',
  'advice-service-yours': 'If your present shock only feels tired, servicing it is a real alternative.',
} as const;
