using SampleWell;
using SampleWell.Twins;

if (args is ["--twin", var twin])
{
    Twin.Write(twin, 15_000, 1);
    Console.WriteLine(twin);
}
else if (args is [] or [not ['-', ..]])
{
    var folder = args is [var named] ? named : SampleLogs.DefaultFolder;
    SampleLogs.Write(folder);
    Console.WriteLine(folder);
}
else
{
    Console.Error.WriteLine("usage: SampleWell [FOLDER] | --twin FOLDER");
    return 1;
}

return 0;
