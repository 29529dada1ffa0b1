/* Dynamic moduli, Lacy's combined law and both horizontal stresses in one loop: the bound for the program's kernels.
 *
 *   cc -O3 -march=native -o /tmp/stress tests/DepthStress.Benchmarks/comparison/stress.c && /tmp/stress
 *   dotnet run -c Release --project tests/DepthStress.Benchmarks -- kernel
 *
 * Both print the median time per sample of nine measurements and a sum that must agree to about ten digits.
 * Lacy 1997 (SPE 38716): Es = 0.018 Ed^2 + 0.422 Ed, in Mpsi.
 */
#include <stdio.h>
#include <stdlib.h>
#include <time.h>

enum { REPEATS = 9 };
static const long WORK = 30000000;
static const double MPSI = 6894757293.168361;

__attribute__((noinline)) static void fused(
    long n, const double *restrict vp, const double *restrict vs, const double *restrict density, const double *restrict biot,
    const double *restrict sv, const double *restrict pp, double along_min, double along_max, double *restrict dynamic,
    double *restrict still, double *restrict poisson, double *restrict shmin, double *restrict shmax)
{
    for (long i = 0; i < n; i++) {
        double p = vp[i] * vp[i], s = vs[i] * vs[i];
        double nu = (p - 2 * s) / (2 * (p - s));
        double e = 2 * density[i] * s * (1 + nu);
        double m = e / MPSI;
        double es = (0.018 * m * m + 0.422 * m) * MPSI;
        double pressure = biot[i] * pp[i];
        double uniaxial = nu / (1 - nu) * (sv[i] - pressure) + pressure;
        double plane = es / (1 - nu * nu);
        dynamic[i] = e;
        poisson[i] = nu;
        still[i] = es;
        shmin[i] = uniaxial + plane * (along_min + nu * along_max);
        shmax[i] = uniaxial + plane * (along_max + nu * along_min);
    }
}

static double now(void)
{
    struct timespec t;
    clock_gettime(CLOCK_MONOTONIC, &t);
    return 1e9 * (double)t.tv_sec + (double)t.tv_nsec;
}

static int ascending(const void *a, const void *b)
{
    double x = *(const double *)a, y = *(const double *)b;
    return (x > y) - (x < y);
}

int main(void)
{
    long sizes[] = {1000, 15000, 1000000};
    for (int k = 0; k < 3; k++) {
        long n = sizes[k], rounds = WORK / n;
        double *c[11], times[REPEATS], sum = 0;
        for (int j = 0; j < 11; j++)
            if (!(c[j] = malloc((size_t)n * sizeof **c))) return 1;
        for (long i = 0; i < n; i++) {
            c[0][i] = 3000 + (double)(i % 977);
            c[1][i] = 1600 + (double)(i % 557);
            c[2][i] = 2300 + (double)(i % 211);
            c[3][i] = 0.85;
            c[4][i] = 20e6 + 20.0 * (double)i;
            c[5][i] = 9e6 + 9.0 * (double)i;
        }
        for (int r = -1; r < REPEATS; r++) {
            double start = now();
            for (long j = 0; j < rounds; j++)
                fused(n, c[0], c[1], c[2], c[3], c[4], c[5], 150e-6, 400e-6, c[6], c[7], c[8], c[9], c[10]);
            if (r >= 0) times[r] = (now() - start) / (double)(n * rounds);
        }
        qsort(times, REPEATS, sizeof *times, ascending);
        for (long i = 0; i < n; i++) sum += c[9][i] + c[10][i] + c[7][i] + c[8][i];
        printf("%9ld samples %.2f ns/sample, sum %.12E\n", n, times[REPEATS / 2], sum);
        for (int j = 0; j < 11; j++) free(c[j]);
    }
    return 0;
}
