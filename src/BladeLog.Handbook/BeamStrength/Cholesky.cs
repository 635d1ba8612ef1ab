namespace BladeLog.Handbook.BeamStrength;

/// <summary>Cholesky factors of a small symmetric matrix in place, without allocation; the many small solves of a page are dominated by allocation otherwise.</summary>
internal static class Cholesky
{
    /// <summary>Lower factor over the lower triangle; false when the matrix is not positive definite.</summary>
    public static bool Factor(Span<double> a, int n)
    {
        for (int j = 0; j < n; j++)
        {
            for (int i = j; i < n; i++)
            {
                double sum = a[(i * n) + j];
                for (int k = 0; k < j; k++)
                {
                    sum -= a[(i * n) + k] * a[(j * n) + k];
                }

                if (i > j)
                {
                    a[(i * n) + j] = sum / a[(j * n) + j];
                }
                else if (sum > 0)
                {
                    a[(i * n) + j] = Math.Sqrt(sum);
                }
                else
                {
                    return false;
                }
            }
        }

        return true;
    }

    /// <summary>Solves with the factor; the right side becomes the answer.</summary>
    public static void Solve(ReadOnlySpan<double> factor, Span<double> x)
    {
        int n = x.Length;
        for (int i = 0; i < n; i++)
        {
            double sum = x[i];
            for (int k = 0; k < i; k++)
            {
                sum -= factor[(i * n) + k] * x[k];
            }

            x[i] = sum / factor[(i * n) + i];
        }

        for (int i = n - 1; i >= 0; i--)
        {
            double sum = x[i];
            for (int k = i + 1; k < n; k++)
            {
                sum -= factor[(k * n) + i] * x[k];
            }

            x[i] = sum / factor[(i * n) + i];
        }
    }
}
