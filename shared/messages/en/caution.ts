/** Carried on every screen's foot (short) and on every PDF (full), word for word. */
export const caution = {
  short:
    "This worksheet gives no permission to work. A qualified person decides. The law, the local code, the employer's program, the manufacturer's instructions and the equipment's own label come first; where they differ from this sheet, follow the stricter. Treat every conductor as live until it is locked, tested and proved dead at the point of work. Anyone may stop.",
  /** In the order of their numbers, 1 first. `editions`, `contact` and `place` are filled in. */
  full: (filled: {
    editions: string;
    contact: string;
    place: string;
  }): readonly { lead: string; text: string }[] => [
    {
      lead: 'No permission.',
      text: "This is a planning aid. It is not an energized work permit, a lockout procedure, an arc flash study or a training record, and no substitute for a qualified person's judgment at the equipment.",
    },
    {
      lead: 'Order.',
      text: "Law and the authority having jurisdiction, the employer's electrical safety program, the manufacturer's instructions and the equipment's label come before this sheet. The stricter rules.",
    },
    {
      lead: 'It knows only what was typed.',
      text: 'It sees no wire. "Nothing open, nothing stopped" means that the answers broke no rule known to it. A wrong answer makes a wrong sheet.',
    },
    {
      lead: 'Live until proved dead.',
      text: 'Switch positions, breaker directories, drawings, colours, dark lamps and proximity testers prove nothing. Lock, operate every control, test each conductor of each source at each point of work with a meter proved before and after. Test again whenever you have been away, or anything changed.',
    },
    {
      lead: 'Figures.',
      text: `Distances, categories and ratings are taken from ${filled.editions}, in part through public secondary sources; each shows its confidence. Those marked "from memory" or "single source" must be checked in a licensed copy before they are relied on. NFPA, IEEE, IEC, ASTM and OSHA have not reviewed or endorsed this tool.`,
    },
    {
      lead: 'Arc flash.',
      text: '"Not likely" is not impossible. Arc-rated clothing lessens burns; it does not stop blast, noise or fragments. The fault current estimate is an upper bound, not a study; a lower current can burn longer and worse.',
    },
    {
      lead: 'Shock.',
      text: 'The current shown is statistical, for dry skin. No current shown here is safe. 120 V kills.',
    },
    {
      lead: 'Scope.',
      text: 'Lighting and its circuits at 120 to 480 V AC. Not for 347/600 V or higher, DC strings, solar or storage, utility lines, classified locations, manholes. New and renovation work is construction (29 CFR 1926); state plans and local codes may ask more.',
    },
    {
      lead: 'Emergency lighting out of service',
      text: 'must be told to whoever runs the building, and made good or people sent out, until tested again. A discharged battery needs a day of charge before it protects anyone.',
    },
    {
      lead: 'Time and place.',
      text: 'Valid only for this crew, this place, this window and this revision (check the code). Any change: stop, new revision, new briefing.',
    },
    {
      lead: 'Emergency.',
      text: `Do not touch the victim; open the circuit; call ${filled.contact}; CPR; AED at ${filled.place}.`,
    },
    {
      lead: 'Stop.',
      text: 'Anyone may stop or refuse, without giving proof and without penalty.',
    },
  ],
  /** Shown as a caution with 1926.416(a) and 1926.417 where the job is new or renovation work. */
  construction: {
    title: 'Construction rules apply',
    text: 'New and renovation work is construction (29 CFR 1926): tag the deenergized circuit at every point where it can be energized. State plans and local codes may ask more.',
  },
  /** What stands for the brackets where no worksheet fills them. */
  unfilled: {
    editions: 'NFPA 70E-2024 and 29 CFR 1910 Subparts S and I',
    contact: 'the contact on the worksheet',
    place: 'the place on the worksheet',
  },
  /** Over items 1, 3, 5 and 8 of the full text, shown once. */
  firstUse: 'Before the first worksheet, read these.',
  firstUseRead: 'Read',
};

/** The numbers of the full text that are shown at the first use. */
export const FIRST_USE_ITEMS = [1, 3, 5, 8] as const;
