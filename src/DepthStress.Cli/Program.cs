Console.WriteLine("depthstress");
