package lostwork.examples.audit;

/** What {@code --help} prints: the arguments, and how to write the two files. */
final class Help {
    private Help() {}

    static String text() {
        final StringBuilder fuels = new StringBuilder();
        for (SurveyFuel fuel : SurveyFuel.values()) {
            fuels.append(fuels.length() == 0 ? "" : "\n")
                    .append("    ")
                    .append(fuel.label())
                    .append(": ")
                    .append(fuel.composition());
        }
        return """
                Waste-heat audit: how much heat the streams of a works reject, how much work the second law allows to
                win from it, and how much a machine is likely to win. On the best hot gas a steam plant is designed: the
                evaporation pressure with the most net power, its states, its exergy ledger, and what it gives in a year.

                Arguments
                  --survey FILE   the streams, one a line; without it the bundled example is used
                  --site FILE     ambient and prices; without it the bundled example is used
                  --out FOLDER    where the results go; without it %s under the current folder
                  --help          this text
                From Maven: mvn -q compile exec:java -Dexec.args="--survey my.csv --site my.txt --out results"

                Exit code
                  0  all lines were used
                  1  some lines of the survey were refused; the others were used
                  2  nothing was computed: an argument, a file or the output folder could not be used

                Survey file
                  Text in UTF-8, cells separated by commas, numbers with decimal points. Semicolons with decimal commas
                  are accepted where the numbers of the file show it; numbers never have thousands separators. A cell
                  with a comma stands in double quotes. Lines that start with # are skipped. The first line holds the
                  headings, in any order; a heading may state the unit of its column in brackets, as in "flow [t/h]",
                  and a cell with a unit of its own goes before it.

                  tag                      a name, used once
                  medium                   %s
                  composition              dry air, water: empty
                                           humid air: "relative humidity 60 %% at 25 °C" or "humidity ratio 12 g/kg"
                                           flue gas: "natural gas with 18 %% excess air", or with measured oxygen
                                           "natural gas with 3.5 %% O2 dry" or "... O2 wet"; air of the site burns it
                                           gas mixture: mole percents as it flows, "N2 72 %% + CO2 14 %% + H2O 14 %%"
                  flow                     mass: kg/s, kg/h, t/h, t/d, lb/h, water vapour included
                                           gas volume at 0 °C, 101.325 kPa (DIN 1343): Nm³/h; at 15 °C (ISO 13443):
                                           Sm³/h; for gas with water vapour followed by wet or dry
                                           volume at the supply state: m³/h, m³/s, L/s, L/min, ft³/min
                  supply temperature       °C, K, °F, °R; as the stream leaves the process
                  lowest temperature       as far as it may be cooled
                  pressure                 absolute: bar, mbar, kPa, MPa, Pa, atm, psi; above ambient: bar(g), mbar(g)
                  hours per year           up to 8760
                  flow uncertainty         %% of the flow; all uncertainties expanded, with one coverage (say 95 %%)
                  temperature uncertainty  K
                  remark                   free text, may be missing

                  Fuels
                %s
                  Gases
                    %s

                Site file
                  Text in UTF-8, one "key = value" a line; lines that start with # are skipped. Keys, each once:
                %s
                  Prices are in the label that currency names, such as "power price = 96 EUR/MWh".

                Run once without arguments: the two example files are then in the output folder, to start from. Files of an
                earlier run in the same folder are replaced.

                %s
                """.formatted(
                        AuditArguments.DEFAULT_OUTPUT,
                        String.join(", ", MediumName.vocabulary().words()),
                        fuels,
                        String.join(", ", SurveyGas.vocabulary().words()),
                        "    " + String.join("\n    ", SiteKey.vocabulary().words()),
                        Paragraph.wrap(AuditRules.CAUTION));
    }
}
