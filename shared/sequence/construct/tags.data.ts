/** Tags and protease sites known by their residues, as patterns. From memory (handbook of the field), not looked up. */
export const KNOWN_TAGS: ReadonlyArray<{ name: string; pattern: RegExp }> = [
  { name: 'polyhistidine', pattern: /H{6,10}/ },
  { name: 'DYKDDDDK', pattern: /DYKDDDDK/ },
  { name: 'WSHPQFEK', pattern: /WSHPQFEK/ },
  { name: 'haemagglutinin epitope', pattern: /YPYDVPDYA/ },
  { name: 'Myc epitope', pattern: /EQKLISEEDL/ },
  { name: 'tobacco etch virus protease site', pattern: /ENLYFQ[GS]/ },
  { name: 'thrombin site', pattern: /LVPRGS/ },
  { name: 'factor Xa site', pattern: /I[ED]GR/ },
  { name: 'enterokinase site', pattern: /DDDDK/ },
  { name: 'rhinovirus 3C site', pattern: /LEVLFQGP/ },
];
