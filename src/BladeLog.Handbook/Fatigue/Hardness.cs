using BladeLog.Handbook.Band;
using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Fatigue;

/// <summary>Hardness scales of steel and the strength that goes with them. Enter the hardness of the body (the back), never of the tooth tip.</summary>
public static class Hardness
{
    // HRC, HB (3000 kgf, carbide ball), HV, tensile strength in ksi.
    private static readonly (double Hrc, double Hb, double Hv, double Ksi)[] Rows =
    [
        (20, 226, 238, 110), (24, 247, 260, 119), (28, 271, 286, 131), (30, 286, 302, 138), (32, 301, 318, 146), (34, 319, 336, 152),
        (36, 336, 354, 161), (38, 353, 372, 171), (40, 371, 392, 182), (42, 390, 412, 194), (44, 409, 434, 208), (45, 421, 446, 215),
        (46, 432, 458, 221), (47, 443, 471, 229), (48, 455, 484, 238), (49, 469, 498, 246), (50, 481, 513, 255), (51, 496, 528, 264),
        (52, 512, 544, 273), (54, 543, 577, 292), (56, 577, 613, 313), (58, 615, 653, 338),
    ];

    /// <summary>The softest body the table holds, HRC.</summary>
    public static double LeastHrc => Rows[0].Hrc;

    /// <summary>The hardest body the table holds, HRC.</summary>
    public static double GreatestHrc => Rows[^1].Hrc;

    /// <summary>Brinell hardness (3000 kgf, carbide ball) of a steel of this Rockwell C hardness.</summary>
    /// <remarks>Straight lines between the rows of the table, 20 to 58 HRC; outside it throws.</remarks>
    /// <source key="astm-e140" where="conversion table for non-austenitic steels, HRC to HB"/>
    public static double Brinell(double hrc) => Between(hrc, row => row.Hb);

    /// <summary>Vickers hardness of a steel of this Rockwell C hardness.</summary>
    /// <remarks>Straight lines between the rows of the table, 20 to 58 HRC; outside it throws.</remarks>
    /// <source key="astm-e140" where="conversion table for non-austenitic steels, HRC to HV"/>
    public static double Vickers(double hrc) => Between(hrc, row => row.Hv);

    /// <summary>Tensile strength of a steel of this Rockwell C hardness, as the table has it.</summary>
    /// <remarks>Straight lines between the rows of the table, 20 to 58 HRC; outside it throws. Good to ±8 of 100 for strip.</remarks>
    /// <source key="astm-a370" where="hardness conversion table, approximate tensile strength (ksi); same column in SAE J417"/>
    public static Stress TableTensileStrength(double hrc) => new(Between(hrc, row => row.Ksi) * 1000 * Units.Exact.Psi);

    /// <summary>Tensile strength from Brinell hardness: the value the fatigue chapter uses.</summary>
    /// <remarks>S_u = 3.45 HB, MPa. HB above zero; within 7 of 100 of the table from 20 to 54 HRC, 9 of 100 under it at 58.</remarks>
    /// <source key="dowling-book" where="S_u = 3.45 HB, from memory; shigley prints 3.4 HB"/>
    public static Stress TensileStrength(double brinell)
    {
        double HB = Require.Positive(brinell, nameof(brinell), "Brinell hardness");
        return Stress.FromMegapascals(3.45 * HB);
    }

    private static double Between(double hrc, Func<(double Hrc, double Hb, double Hv, double Ksi), double> column)
    {
        Require.Between(hrc, LeastHrc, GreatestHrc, nameof(hrc), "hardness of the body in HRC");
        int i = 1;
        while (Rows[i].Hrc < hrc)
        {
            i++;
        }

        double share = (hrc - Rows[i - 1].Hrc) / (Rows[i].Hrc - Rows[i - 1].Hrc);
        return column(Rows[i - 1]) + share * (column(Rows[i]) - column(Rows[i - 1]));
    }
}
