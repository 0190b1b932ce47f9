/**
 * An invented survey for the first run: planets, hosts, numbers and the survey itself are made up. It holds every verdict
 * and every reason for refusing one, in the columns of our own lists.
 */
export const surveyTitle = "The Saltmarsh Survey";

export const survey = `\
# The Saltmarsh Survey: invented planets that show what Bulkwright says about real ones.
name,mass_earth,mass_earth_minus,mass_earth_plus,mass_earth_limit,minimum_mass_earth,minimum_mass_earth_minus,minimum_mass_earth_plus,mass_provenance,radius_earth,radius_earth_minus,radius_earth_plus,radius_earth_limit,radius_provenance
Saltmarsh-1 b,6.1,0.4,0.4,,,,,radial velocity,1.12,0.03,0.03,,transit
Saltmarsh-1 c,2.9,0.2,0.25,,,,,radial velocity,1.02,0.04,0.04,,transit
Saltmarsh-2 b,1.02,0.06,0.06,,,,,transit timing,0.99,0.02,0.02,,transit
Saltmarsh-2 c,0.42,0.04,0.05,,,,,transit timing,0.78,0.015,0.015,,transit
Saltmarsh-2 d,1.85,0.11,0.11,,,,,transit timing,1.19,0.02,0.03,,transit
Saltmarsh-3 b,4.7,0.2,0.2,,,,,radial velocity,1.51,0.03,0.03,,transit
Saltmarsh-4 b,7.9,0.5,0.6,,,,,radial velocity,1.58,0.04,0.04,,transit
Saltmarsh-5 b,3.3,0.3,0.3,,,,,radial velocity,1.26,0.03,0.03,,transit
Saltmarsh-5 c,5.2,0.4,0.4,,,,,radial velocity,1.61,0.04,0.05,,transit
Saltmarsh-6 b,2.2,0.15,0.15,,,,,radial velocity,1.45,0.03,0.03,,transit
Saltmarsh-6 c,6.4,0.5,0.5,,,,,radial velocity,1.97,0.04,0.04,,transit
Saltmarsh-7 b,9.6,0.7,0.8,,,,,radial velocity,2.31,0.05,0.05,,transit
Saltmarsh-7 c,1.1,0.2,0.2,,,,,radial velocity,1.24,0.03,0.03,,transit
Saltmarsh-8 b,4.4,0.5,0.5,,,,,radial velocity,2.62,0.06,0.06,,transit
Saltmarsh-8 c,11.5,0.9,0.9,,,,,radial velocity,3.4,0.1,0.1,,transit
Saltmarsh-9 b,3.8,1.1,1.6,,,,,radial velocity,1.55,0.08,0.08,,transit
Saltmarsh-9 c,5.5,1.8,1.8,,,,,radial velocity,2.0,0.2,0.25,,transit
Saltmarsh-10 b,8.3,2.9,,,,,,radial velocity,1.9,0.1,0.1,,transit
Saltmarsh-10 c,3.1,,,,,,,radial velocity,1.4,0.05,0.05,,transit
Saltmarsh-11 b,2.7,0,0,,,,,radial velocity,1.33,,,,transit
Saltmarsh-11 c,9.0,,,1,,,,radial velocity,1.72,0.06,0.06,,transit
Saltmarsh-12 b,0.9,,,-1,,,,transit timing,1.1,0.04,0.04,,transit
Saltmarsh-13 b,,,,,4.2,0.5,0.5,radial velocity,1.6,0.05,0.05,,transit
Saltmarsh-13 c,,,,,12.4,1.1,1.1,radial velocity,,,,,
Saltmarsh-14 b,5.9,1.4,1.9,,,,,mass-radius relation,2.1,0.08,0.08,,transit
Saltmarsh-15 b,4.0,0.6,0.6,,,,,radial velocity,1.6,0.1,0.1,,estimated from the mass
Saltmarsh-16 b,3.0,0.5,0.5,,,,,model of formation,1.4,0.1,0.1,,model of formation
Saltmarsh-17 b,,,,,,,,,1.38,0.05,0.05,,transit
Saltmarsh-17 c,6.6,0.6,0.6,,,,,radial velocity,,,,,
Saltmarsh-18 b,about 5,0.5,0.5,,,,,radial velocity,1.7,0.05,0.05,,transit
Saltmarsh-18 c,-3.1,0.5,0.5,,,,,radial velocity,1.3,0.05,0.05,,transit
Saltmarsh-19 b,4.5,0.4,0.4,,,,,radial velocity,0,,,,transit
Saltmarsh-20 b,3200,150,150,,,,,radial velocity,11.2,0.3,0.3,,transit
Saltmarsh-21 b,7.7,0.8,0.8,,,,,radial velocity,2.5,,,1,transit
"Saltmarsh-22 b, outer",1.6,0.2,0.2,,,,,transit timing,0.95,0.1,,,transit
Saltmarsh-22 #2,2.4,0.3,0.3,,,,,transit timing,1.8,,,-1,transit
`;
