/** The people of the invented department. Names are made up; any likeness to someone living is chance. */
export interface SeedPerson { key: string, name: string }

export const mailDomain = 'tamarackbend.example'

const person = (key: string, name: string): SeedPerson => ({ key, name })

export const staff = {
  admin: person('rosalind.tavares', 'Rosalind Tavares'),
  technician: person('emeka.brandvold', 'Emeka Brandvold'),
  visitor: person('yuki.hallam', 'Yuki Hallam'),
  lead: person('marit.adeyemi', 'Marit Solheim Adeyemi'),
  instructor: person('tomas.villasenor', 'Tomás Villaseñor'),
  secondLead: person('hana.lindqvist', 'Hana Lindqvist'),
  ta: person('priya.deshmukh', 'Priya Deshmukh'),
  otherTa: person('caleb.norcross', 'Caleb Norcross'),
  taAndStudent: person('linnea.castellan', 'Linnea Castellan'),
  formerTa: person('goran.petrossian', 'Goran Petrossian'),
} as const

/** Of the main course in the running term, in the order of the roster; the first twenty-eight came on time. */
export const mainStudents: readonly SeedPerson[] = [
  person('amara.oyelaran', 'Amara Oyelaran'), person('jonas.brekke', 'Jonas Brekke'), person('mei.tsukada', 'Mei Tsukada'), person('diego.arriaga', 'Diego Arriaga'),
  person('siobhan.kilcarragh', 'Siobhán Kilcarragh'), person('farid.nazarov', 'Farid Nazarov'), person('hoku.kealamakia', 'Hōkū Kealamakia'), person('greta.osterlund', 'Greta Österlund'),
  person('tariq.al-mansouri', 'Tariq al-Mansouri'), person('ines.carvalhal', 'Inês Carvalhal'), person('wojciech.zdanowski', 'Wojciech Zdanowski'), person('leilani.fonoti', 'Leilani Fonoti'),
  person('ravi.sundaresan', 'Ravi Sundaresan'), person('chloe.beaurivage', 'Chloé Beaurivage-Whitcombe'), person('mateo.quispe', 'Mateo Quispe'), person('nadia.hrytsenko', 'Nadia Hrytsenko'),
  person('kofi.amponsem', 'Kofi Amponsem'), person('elspeth.mcquarrie', 'Elspeth McQuarrie'), person('bao.trinh', 'Bảo Trịnh'), person('yildiz.karaca', 'Yıldız Karaca'),
  person('samuel.redfern', 'Samuel Redfern'), person('ayelet.ronen', 'Ayelet Ronen'), person('dmitri.volkonin', 'Dmitri Volkonin'), person('zanele.mokoatle', 'Zanele Mokoatle'),
  person('oskar.wikander', 'Oskar Wikander'), person('paloma.ibarrondo', 'Paloma Ibarrondo'), person('june.halvarson', 'June Halvarson'), person('arjun.mehrotra', 'Arjun Mehrotra'),
  person('freya.damgaard', 'Freya Damgaard'), person('luca.pellegrinelli', 'Luca Pellegrinelli'),
]

/** Of the smaller course; the TA of the main one sits here as a student. */
export const smallStudents: readonly SeedPerson[] = [
  staff.taAndStudent, person('henrik.aasgaard', 'Henrik Aasgaard'), person('adaeze.nwachukwu', 'Adaeze Nwachukwu'), person('tobias.kessling', 'Tobias Kessling'), person('roya.farahani', 'Roya Farahani'),
  person('marcus.delacroy', 'Marcus Delacroy'), person('sunniva.hegland', 'Sunniva Hegland'), person('ikaika.palakiko', 'Ikaika Palakiko'), person('violeta.stoyanova', 'Violeta Stoyanova'),
  person('nikhil.vaidyan', 'Nikhil Vaidyan'), person('rosa.etxarri', 'Rosa Etxarri'), person('owen.glasbury', 'Owen Glasbury'),
]

/** Of the main course a term ago; some of them are in the smaller course by now. */
export const pastStudents: readonly SeedPerson[] = [
  ...smallStudents.slice(1, 7),
  person('abena.sarfo', 'Abena Sarfo'), person('cyrus.bahrami', 'Cyrus Bahrami'), person('daniela.montserrate', 'Daniela Montserrate'), person('einar.fjellheim', 'Einar Fjellheim'),
  person('fatou.diallobe', 'Fatou Diallobe'), person('gideon.ashworthy', 'Gideon Ashworthy'), person('hyejin.baek', 'Hye-jin Baek'), person('ivana.krstelj', 'Ivana Krstelj'),
  person('joaquin.saavedra', 'Joaquín Saavedra'), person('kirsi.lahdelma', 'Kirsi Lahdelma'), person('liam.ockendon', 'Liam Ockendon'), person('mirembe.kasule', 'Mirembe Kasule'),
]

export const emailOf = (seed: SeedPerson): string => `${seed.key}@${mailDomain}`

/** Everybody, each once. */
export const everybody: readonly SeedPerson[] = [...new Map([...Object.values(staff), ...mainStudents, ...smallStudents, ...pastStudents].map(seed => [seed.key, seed])).values()]
