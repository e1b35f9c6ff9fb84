/**
 * The practice records that default rules and warnings rest on, with where each was read. `memory`: recalled,
 * to be confirmed before it is shown as more than a starting figure.
 */

export type PracticeSource = { title: string; address: string | null; read: boolean };

export const PRACTICE_SOURCES: Readonly<Record<string, PracticeSource>> = {
  F01: {
    title: 'Field Installation and Service Manual, Professional Cabinet Solutions (2017)',
    address:
      'https://viewer.joomag.com/field-installation-and-service-manual-ims102/0629845001389024403?page=7',
    read: true,
  },
  F02: {
    title: 'Fix My Cabinet',
    address: 'http://fixmycabinet.com/2010/06/15/base-cabinet-fillers/',
    read: true,
  },
  F03: {
    title: 'Fix My Cabinet',
    address: 'http://fixmycabinet.com/2010/06/15/base-cabinet-fillers/',
    read: true,
  },
  F04: {
    title: 'Cabinet Academy article',
    address: 'https://www.cabinetacademy.com/blog/make-sure-drawers-dont-hit-appliances',
    read: true,
  },
  F05: {
    title: 'Cabinet Wholesalers; JLC stock-cabinet article',
    address: 'https://cabinet-wholesalers.com/whats-the-1-mistake-people-make-with-cabinets/',
    read: true,
  },
  F06: {
    title: 'DIY Kitchens advice (UK maker)',
    address:
      'https://advice.diy-kitchens.com/customer-questions/what-are-kitchen-corner-posts-and-why-are-they-needed/',
    read: true,
  },
  F11: {
    title: 'WOODWEB knowledge base thread: Scribing cabinets',
    address: 'https://www.woodweb.com/knowledge_base/Scribing_cabinets_and_Z_clips.html',
    read: true,
  },
  F13: {
    title: 'Australian Govt-funded kitchen & bath cabinetmaking training units',
    address:
      'https://kbcabinetmaking.com.au/unit10_installing_onsite/section2_installing_modular_units/lesson6_finishing_to_the_wall.htm',
    read: true,
  },
  F15: {
    title: 'Fix My Cabinet',
    address:
      'https://fixmycabinet.com/2010/02/22/refrigerator-opening-size-installing-cabinets/trackback',
    read: true,
  },
  F16: {
    title: 'American Made Cabinets; Avallon manual; Dacor manual',
    address: 'https://manualsdump.com/en/manuals/dacor-dyf48bndi/79791/10',
    read: true,
  },
  F19: {
    title: 'GE installation instructions',
    address: 'https://www.manualslib.com/manual/256211/Ge-206c1559p195.html?page=3',
    read: true,
  },
  F23: {
    title: 'GE, Amana, ZLINE, DCS instructions',
    address: 'https://manualshive.com/en/manual/ge/jgsp48/4307585?page=6',
    read: true,
  },
  F25: {
    title: 'Natural Handyman / Handyman Club; Engineer Fix',
    address: 'http://www.naturalhandyman.com/iip/infcabinets/cabinet_class.html',
    read: true,
  },
  F26: {
    title: 'Boulder Library text; LSU AgCenter',
    address:
      'https://www.lsuagcenter.com/topics/family_home/home/design_construction/safer%20stronger%20smarter/ideal%20home/functional%20accessible%20adaptable/kitchen-design-and-space-guidelines',
    read: true,
  },
  F27: {
    title: 'Interior Wood Doors; Engineer Fix; WOODWEB kick boxes',
    address: 'https://engineerfix.com/how-to-build-a-base-for-cabinets-to-sit-on/',
    read: true,
  },
  F28: {
    title: 'DIY Kitchens advice (UK maker)',
    address: 'https://advice.diy-kitchens.com/customer-questions/gap-between-worktop-wall-units/',
    read: true,
  },
  F30: {
    title: 'Install My Kitchen; Kitchens Fitted',
    address: 'http://kitchensfitted.co.uk/tips-and-advice/installing-kitchen-wall-units/',
    read: true,
  },
  F31: {
    title: 'Australian Govt-funded kitchen & bath cabinetmaking training units; Smartpack',
    address: 'https://blog.smartpackkit.com.au/2010/07/03/kickboards-building-on-a-solid-base/',
    read: true,
  },
  F35: {
    title: 'Journal of Light Construction',
    address:
      'https://www.jlconline.com/how-to/interiors/dealing-with-out-of-level-kitchen-ceilings_o',
    read: true,
  },
  F36: {
    title: 'Palm Harbor; LWI Custom; This Old House text',
    address: 'https://thisoldhousesa.pages.dev/posts/how-to-hang-crown-molding-on-kitchen-cabinets',
    read: true,
  },
  F38: {
    title: 'Construction Place FAQ of performance standards',
    address:
      'https://faq.constructionplace.com/faq_category/performance-standards-quality-control/cabinets-and-counter-tops',
    read: true,
  },
  F42: {
    title: 'general trade knowledge',
    address: null,
    read: false,
  },
  F45: {
    title: 'NKBA guidelines as republished',
    address: 'http://www.simplycabinetry.com/design-guidelines-nkba',
    read: true,
  },
  M01: {
    title: 'Fitted Kitchen Info measuring guide (UK)',
    address: 'http://www.fittedkitchen.info/design/measuring3.php',
    read: true,
  },
  M02: {
    title: 'Australian Govt-funded kitchen & bath cabinetmaking training units',
    address:
      'https://kbcabinetmaking.com.au/unit7_checking_fit/section1_checking_measurements/lesson1_room_dimensions.htm',
    read: true,
  },
  M03: {
    title: 'IS Decoration measuring article (UK)',
    address: 'http://isdecoration.com/measuring-your-kitchen/',
    read: true,
  },
  M04: {
    title: 'Panda Design measuring guide (UK)',
    address: 'http://www.pandadesign.co.uk/guides/measure3.html',
    read: true,
  },
  M05: {
    title: 'Restore Warehouse measuring guide',
    address: 'https://therestorewarehouse.com/how-to-measure',
    read: true,
  },
  M14: {
    title: 'Journal of Light Construction',
    address: 'https://www.jlconline.com/how-to/interiors/avoiding-accumulated-errors_o',
    read: true,
  },
  M15: {
    title: 'Fix My Cabinet',
    address:
      'https://fixmycabinet.com/2010/02/22/refrigerator-opening-size-installing-cabinets/trackback',
    read: true,
  },
  M17: {
    title: 'NIST Handbook 44 sec. 5.52, quoted by Corada',
    address:
      'https://corada.com/documents/dimensional-tolerances-in-construction-and-for-surface-accessibility/Metal-measuring-tapes',
    read: true,
  },
  M18: {
    title: 'tape maker article (stored without address)',
    address: null,
    read: true,
  },
  M30: {
    title: 'Webster Kitchen & Bath; JC Woodworking blog',
    address:
      'https://webster-kitchen-and-bath-pi3.pages.dev/blog/how-mike-quotes-kitchen-remodels/',
    read: true,
  },
  M31: {
    title: 'Architectural Woodwork Standards, 1st ed. 2009 (AWI/AWMAC/WI)',
    address: 'https://issuhub.com/view/index?id=4686&pageIndex=333',
    read: true,
  },
  M33: {
    title: 'New Home Warranty Program of Saskatchewan 2014',
    address: 'http://www.beagleproductions.com/nhwp/main.php?pid=149',
    read: true,
  },
  M34: {
    title: 'Oliver Homes warranty',
    address: 'https://www.oliverhomes.com/customer_care/article.html?category_id=9&article_id=53',
    read: true,
  },
  M35: {
    title: 'Journal of Light Construction',
    address:
      'https://www.jlconline.com/how-to/interiors/installing-base-cabinets-in-out-of-level-kitchens_o',
    read: true,
  },
  M36: {
    title: 'P&P kitchen installation tips (Spanish)',
    address: 'https://platoyplacer.com/consejos-para-la-instalacion-de-armarios-de-cocina/',
    read: true,
  },
  S06: {
    title: 'Kitchen Cabinet Installation Hand Book (maker, 2009)',
    address:
      'https://abcdocz.com/doc/157447/kitchen-cabinet-installation-hand-book-________________',
    read: true,
  },
  T01: {
    title: 'Fine Homebuilding forum',
    address: 'https://finehomebuilding.com/forum/how-long-to-install-cabinets',
    read: true,
  },
  T03: {
    title: 'aggregator page',
    address:
      'https://ventolaphotography.com/how-many-man-hours-does-it-take-to-install-kitchen-cabinets/',
    read: true,
  },
  T14: {
    title: 'DC Distribution',
    address: 'http://www.dc-distribution.com/making-the-template',
    read: true,
  },
  T15: {
    title: 'TI Woodworks',
    address: 'https://www.tiwoodworks.com/process/planning/schedule',
    read: true,
  },
  T16: {
    title: 'Dickson Cabinet Co; H&J Cabinets',
    address: 'https://dicksoncabinetco.com/journal/custom-cabinet-process-timeline',
    read: true,
  },
  T18: {
    title: 'Boost; British Gas business; loveMONEY',
    address:
      'https://www.boostpower.co.uk/help/topics/my-boost/guaranteed-standards-of-performance.html',
    read: true,
  },
};
